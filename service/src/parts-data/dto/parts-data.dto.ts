import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  IsInt,
  IsNumber,
  IsOptional,
  IsPositive,
  IsString,
  Max,
  MaxLength,
  Min,
} from 'class-validator';

export class PartsQueryDto {
  @ApiPropertyOptional({ description: 'Part of the type or of its role.' })
  @IsOptional()
  @IsString()
  @MaxLength(60)
  search?: string;

  @ApiPropertyOptional({ description: 'Heater or lamp volts, within 3 %.' })
  @IsOptional()
  @Type(() => Number)
  @IsNumber()
  @IsPositive({ message: 'Volts must be above zero.' })
  volts?: number;

  @ApiPropertyOptional({ description: 'Heater or lamp amps, within 3 %.' })
  @IsOptional()
  @Type(() => Number)
  @IsNumber()
  @IsPositive({ message: 'Amps must be above zero.' })
  amps?: number;

  @ApiPropertyOptional({ default: 50, maximum: 300 })
  @IsOptional()
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(300)
  limit?: number;

  @ApiPropertyOptional({ default: 0 })
  @IsOptional()
  @Type(() => Number)
  @IsInt()
  @Min(0)
  offset?: number;
}

export class PartTypeDto {
  @ApiProperty() type: string;
  @ApiProperty() volts: number;
  @ApiProperty() amps: number;
  @ApiProperty() source: string;
  @ApiProperty({ description: '“confirmed” for the fields it names, else “from memory”.' })
  status: string;
  @ApiPropertyOptional({ description: 'What the tube does.' }) role?: string;
  @ApiPropertyOptional({ type: [Number] }) heaterPins?: number[];
  @ApiPropertyOptional() maxHeaterCathodeVolts?: number;
  @ApiPropertyOptional() base?: string;
  @ApiPropertyOptional() bulb?: string;
  @ApiPropertyOptional() beadColour?: string;
  @ApiPropertyOptional() note?: string;
  @ApiPropertyOptional({ type: [String] }) confirmedFields?: string[];
}

export class PartTypesDto {
  @ApiProperty() total: number;
  @ApiProperty({ type: [PartTypeDto] }) items: PartTypeDto[];
}
