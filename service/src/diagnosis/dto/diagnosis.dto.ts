import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsIn, IsOptional, IsString, MaxLength, ValidateBy } from 'class-validator';
import { type Take, TAKES } from '../../engine';
import type { DiagnosisRow } from '../diagnosis.model';
import { DiagnosisResultDto } from './diagnosis-result.dto';

export class DiagnosisDto {
  @ApiProperty() id: number;
  @ApiProperty({ format: 'date-time' }) at: string;
  @ApiProperty() engineVersion: string;
  @ApiProperty({ description: 'Milliseconds the ranking took.' }) ms: number;
  @ApiProperty({
    type: [Number],
    description: 'Readings it used, in the order the result counts them.',
  })
  readingIds: number[];
  @ApiProperty({ type: DiagnosisResultDto }) result: DiagnosisResultDto;
}

/** A diagnosis as it leaves the server. */
export function presentDiagnosis(row: DiagnosisRow): DiagnosisDto {
  const { id, createdAt, engineVersion, ms, readingIds, result } = row;
  return { id, at: createdAt.toISOString(), engineVersion, ms, readingIds, result };
}

export class ComparePointDto {
  @ApiProperty({ enum: ['point', 'part'] }) kind: 'point' | 'part';
  @ApiProperty() key: string;
  @ApiProperty() label: string;
  @ApiProperty({ enum: TAKES, enumName: 'Take' }) take: Take;
  @ApiPropertyOptional({ type: [String], minItems: 2, maxItems: 2 }) at?: [string, string];
  @ApiPropertyOptional() part?: string;
  @ApiProperty({ type: Number, nullable: true }) value: number | null;
  @ApiProperty({ type: Number, nullable: true }) low: number | null;
  @ApiProperty({ type: Number, nullable: true }) high: number | null;
  @ApiPropertyOptional() published?: number;
  @ApiPropertyOptional({ oneOf: [{ type: 'number' }, { type: 'string', enum: ['OL'] }] })
  measured?: number | 'OL';
  @ApiPropertyOptional() deviations?: number;
  @ApiProperty() order: number;
}

export class CompareDto {
  @ApiProperty({ type: [ComparePointDto] }) points: ComparePointDto[];
  @ApiProperty({ description: 'Line voltage the computed values hold for.' }) lineVolts: number;
}

export class EquationDto {
  @ApiProperty() node: string;
  @ApiProperty() text: string;
  @ApiProperty() tex: string;
  @ApiPropertyOptional() mathml?: string;
}

export class WorkingDto {
  @ApiProperty({ type: [String] }) nodes: string[];
  @ApiProperty({ type: [EquationDto] }) equations: EquationDto[];
  @ApiProperty({ type: 'object', additionalProperties: { type: 'number' } }) solution: Record<
    string,
    number
  >;
  @ApiProperty({ type: [String] }) notes: string[];
  @ApiProperty() residual: number;
  @ApiProperty() agreesWithSolver: boolean;
}

export class AskClosedFormDto {
  @ApiProperty({ description: 'Part whose value stays unknown.' })
  @IsString()
  @MaxLength(24)
  part: string;

  @ApiProperty({ enum: TAKES, enumName: 'Take' })
  @IsIn(TAKES, { message: 'Choose the reading to explain.' })
  take: Take;

  @ApiPropertyOptional({ type: [String], minItems: 2, maxItems: 2 })
  @IsOptional()
  @ValidateBy({
    name: 'leads',
    validator: {
      validate: (value: unknown) =>
        Array.isArray(value) &&
        value.length === 2 &&
        value.every((node) => typeof node === 'string'),
      defaultMessage: () => 'Name the two nodes the leads were on, red lead first.',
    },
  })
  at?: [string, string];

  @ApiPropertyOptional({ description: 'Part the reading was taken on.' })
  @IsOptional()
  @IsString()
  @MaxLength(24)
  readingPart?: string;
}

export class ClosedFormDto {
  @ApiProperty() part: string;
  @ApiProperty({ type: 'object', additionalProperties: true }) reading: Record<string, unknown>;
  @ApiProperty() text: string;
  @ApiProperty() tex: string;
  @ApiPropertyOptional() mathml?: string;
  @ApiProperty({ type: Number, nullable: true }) impliedValue: number | null;
  @ApiProperty({ enum: ['ohms'] }) unit: 'ohms';
  @ApiProperty() note: string;
}
