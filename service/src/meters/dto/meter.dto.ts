import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import {
  IsNotEmpty,
  IsNumber,
  IsOptional,
  IsPositive,
  IsString,
  Max,
  MaxLength,
} from 'class-validator';

class MeterFields {
  @ApiPropertyOptional({ description: 'Input resistance on volts, ohms.' })
  @IsOptional()
  @IsNumber()
  @IsPositive({ message: 'Ohms must be above zero.' })
  ohms?: number;

  @ApiPropertyOptional({ description: 'Moving-coil meters: ohms per volt of full scale.' })
  @IsOptional()
  @IsNumber()
  @IsPositive({ message: 'Ohms per volt must be above zero.' })
  ohmsPerVolt?: number;

  @ApiPropertyOptional({ description: 'Full scale of the range used, volts.' })
  @IsOptional()
  @IsNumber()
  @IsPositive({ message: 'Full scale must be above zero.' })
  fullScale?: number;

  @ApiPropertyOptional({ description: 'Accuracy as a fraction of the reading.' })
  @IsOptional()
  @IsNumber()
  @IsPositive()
  @Max(0.5, { message: 'Accuracy is a fraction such as 0.01 for 1 %.' })
  ofReading?: number;

  @ApiPropertyOptional({ description: 'Accuracy as a fraction of full scale.' })
  @IsOptional()
  @IsNumber()
  @IsPositive()
  @Max(0.5, { message: 'Accuracy is a fraction such as 0.03 for 3 %.' })
  ofFullScale?: number;

  @ApiPropertyOptional({ description: 'Accuracy in counts of the last digit.' })
  @IsOptional()
  @IsNumber()
  @IsPositive()
  @Max(100)
  digits?: number;
}

export class CreateMeterDto extends MeterFields {
  @ApiProperty({ maxLength: 80 })
  @IsString()
  @IsNotEmpty({ message: 'Give the meter a name.' })
  @MaxLength(80)
  name: string;
}

export class MeterDto extends MeterFields {
  @ApiProperty() id: number;
  @ApiProperty() name: string;
}
