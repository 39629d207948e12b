import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import {
  IsArray,
  IsNotEmpty,
  IsNumber,
  IsObject,
  IsOptional,
  IsPositive,
  IsString,
  MaxLength,
} from 'class-validator';
import type { Netlist } from '../../engine';

export class CheckCircuitDto {
  @ApiProperty({ type: 'object', additionalProperties: true })
  @IsObject({ message: 'The netlist must be a JSON object.' })
  netlist: Record<string, unknown>;
}

export class ImportCsvDto {
  @ApiProperty({ description: 'Text of the CSV file.' })
  @IsString()
  @IsNotEmpty({ message: 'Paste the file or choose one.' })
  @MaxLength(1_000_000)
  csv: string;

  @ApiProperty()
  @IsString()
  @IsNotEmpty({ message: 'Give the circuit a title.' })
  @MaxLength(200)
  title: string;

  @ApiProperty({ example: 'CHASSIS' })
  @IsString()
  @IsNotEmpty({ message: 'Name the node that readings are taken against.' })
  @MaxLength(40)
  reference: string;

  @ApiPropertyOptional({
    type: 'object',
    additionalProperties: true,
    description: 'Line: hot, return, volts, hertz.',
  })
  @IsOptional()
  @IsObject()
  line?: Record<string, unknown>;
}

export class SolveCircuitDto extends CheckCircuitDto {
  @ApiPropertyOptional({ type: 'array', items: { type: 'object', additionalProperties: true } })
  @IsOptional()
  @IsArray()
  asFound?: Record<string, unknown>[];

  @ApiPropertyOptional()
  @IsOptional()
  @IsNumber()
  @IsPositive({ message: 'The line voltage must be above zero.' })
  lineVolts?: number;
}

export class CircuitProblemDto {
  @ApiProperty() code: string;
  @ApiProperty() message: string;
  @ApiPropertyOptional() part?: string;
  @ApiPropertyOptional({ type: [String] }) nodes?: string[];
  @ApiPropertyOptional() path?: string;
}

export class CheckedCircuitDto {
  @ApiProperty({ type: [CircuitProblemDto] }) problems: CircuitProblemDto[];
}

export class ImportedCircuitDto extends CheckedCircuitDto {
  @ApiProperty({ type: 'object', additionalProperties: true }) netlist: Netlist;
}

export class OperatingPointDto {
  @ApiProperty({
    type: 'object',
    additionalProperties: {
      type: 'object',
      properties: {
        acVolts: { type: 'number' },
        dcVolts: { type: 'number' },
        rippleVolts: { type: 'number' },
      },
    },
  })
  nodes: Record<string, { acVolts?: number; dcVolts?: number; rippleVolts?: number }>;

  @ApiProperty({
    type: 'object',
    additionalProperties: {
      type: 'object',
      required: ['volts', 'amps', 'watts'],
      properties: {
        volts: { type: 'number' },
        amps: { type: 'number' },
        watts: { type: 'number' },
      },
    },
  })
  parts: Record<string, { volts: number; amps: number; watts: number }>;
}

export class SolvedCircuitDto {
  @ApiProperty({ type: OperatingPointDto }) healthy: OperatingPointDto;
}
