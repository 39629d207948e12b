import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { OperatingPointDto } from '../../circuits/dto/circuits.dto';
import { FAULT_MODES, type FaultMode, type Take, TAKES } from '../../engine';

/** The engine's result as the API describes it; the shapes are the engine's own. */
export class FaultDto {
  @ApiProperty() part: string;
  @ApiProperty({ enum: FAULT_MODES, enumName: 'FaultMode' }) mode: FaultMode;
  @ApiPropertyOptional() value?: number;
  @ApiPropertyOptional({ type: [Number], minItems: 2, maxItems: 2 }) interval?: [number, number];
  @ApiPropertyOptional({ enum: ['factor', 'ohms'] }) valueUnit?: 'factor' | 'ohms';
  @ApiPropertyOptional() volts?: number;
  @ApiPropertyOptional() amps?: number;
  @ApiPropertyOptional({ type: [String] }) types?: string[];
}

export class RuleVoiceDto {
  @ApiProperty() rule: string;
  @ApiProperty({ enum: ['speaks-for', 'speaks-against', 'cause'] }) effect:
    'speaks-for' | 'speaks-against' | 'cause';
  @ApiPropertyOptional() factor?: number;
  @ApiProperty() because: string;
}

export class ReadingEvidenceDto {
  @ApiProperty({ description: 'Index into the readings used.' }) reading: number;
  @ApiProperty({ type: Number, nullable: true, description: 'Null for OL.' }) predicted:
    number | null;
  @ApiPropertyOptional() low?: number;
  @ApiPropertyOptional() high?: number;
  @ApiProperty() times: number;
  @ApiProperty() slip: boolean;
}

export class SuspectCauseDto {
  @ApiProperty() name: string;
  @ApiProperty() because: string;
}

export class SuspectDto {
  @ApiProperty({ type: [FaultDto] }) faults: FaultDto[];
  @ApiProperty() probability: number;
  @ApiProperty() group: number;
  @ApiProperty() title: string;
  @ApiProperty({ type: [String] }) reasons: string[];
  @ApiProperty({ type: [ReadingEvidenceDto] }) evidence: ReadingEvidenceDto[];
  @ApiProperty({ type: [RuleVoiceDto] }) rules: RuleVoiceDto[];
  @ApiPropertyOptional({ type: SuspectCauseDto }) cause?: SuspectCauseDto;
}

export class PartChanceDto {
  @ApiProperty() part: string;
  @ApiProperty() probability: number;
}

export class NextReadingDto {
  @ApiProperty({ enum: TAKES, enumName: 'Take' }) take: Take;
  @ApiPropertyOptional({ type: [String], minItems: 2, maxItems: 2 }) at?: [string, string];
  @ApiPropertyOptional() part?: string;
  @ApiProperty() label: string;
  @ApiProperty() bits: number;
  @ApiProperty() minutes: number;
  @ApiProperty() why: string;
}

export class ExpectedValueDto {
  @ApiProperty({ enum: TAKES, enumName: 'Take' }) take: Take;
  @ApiPropertyOptional({ type: [String], minItems: 2, maxItems: 2 }) at?: [string, string];
  @ApiPropertyOptional() part?: string;
  @ApiProperty({ type: Number, nullable: true }) value: number | null;
  @ApiProperty({ type: Number, nullable: true }) low: number | null;
  @ApiProperty({ type: Number, nullable: true }) high: number | null;
  @ApiPropertyOptional({ oneOf: [{ type: 'number' }, { type: 'string', enum: ['OL'] }] })
  measured?: number | 'OL';
  @ApiPropertyOptional() deviations?: number;
}

export class RuleAdviceDto {
  @ApiProperty() rule: string;
  @ApiProperty({ enum: ['advice', 'caution'] }) effect: 'advice' | 'caution';
  @ApiProperty() text: string;
  @ApiProperty() because: string;
}

export class WaitingRuleDto {
  @ApiProperty() rule: string;
  @ApiProperty() for: string;
}

export class DiagnosisResultDto {
  @ApiProperty() engineVersion: string;
  @ApiProperty({ type: [SuspectDto] }) suspects: SuspectDto[];
  @ApiProperty({ type: [PartChanceDto] }) parts: PartChanceDto[];
  @ApiProperty({ type: [NextReadingDto] }) nextReadings: NextReadingDto[];
  @ApiProperty({ type: [ExpectedValueDto] }) expected: ExpectedValueDto[];
  @ApiProperty() settled: boolean;
  @ApiProperty({ type: [String] }) remarks: string[];
  @ApiProperty({ type: [Number] }) retake: number[];
  @ApiProperty() noneOfThese: boolean;
  @ApiProperty({ type: [RuleAdviceDto] }) advice: RuleAdviceDto[];
  @ApiProperty({ type: [WaitingRuleDto] }) waiting: WaitingRuleDto[];
  @ApiProperty({ type: OperatingPointDto }) healthy: OperatingPointDto;
  @ApiProperty() unscored: number;
  @ApiProperty() dropped: number;
  @ApiProperty() scored: number;
}
