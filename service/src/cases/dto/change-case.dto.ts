import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  IsArray,
  IsIn,
  IsInt,
  IsNotEmpty,
  IsNumber,
  IsObject,
  IsOptional,
  IsString,
  Max,
  MaxLength,
  Min,
  ValidateNested,
} from 'class-validator';
import { FAULT_MODES, type FaultMode } from '../../engine';
import { CASE_STATES, type CaseState, type Outcome, OUTCOMES } from '../case.model';
import {
  AS_FOUND_MOST,
  LINE_VOLTS_LEAST,
  LINE_VOLTS_MOST,
  SET_MOST,
  TEXT_MOST,
} from '../case.limits';

const LINE_SENTENCE = `Enter the line voltage in volts, ${LINE_VOLTS_LEAST} to ${LINE_VOLTS_MOST}.`;

export class OpenCaseDto {
  @ApiProperty({ maxLength: SET_MOST, description: 'What stands on the bench.' })
  @IsString()
  @IsNotEmpty({ message: 'Say what set it is.' })
  @MaxLength(SET_MOST)
  set: string;

  @ApiProperty({ maxLength: TEXT_MOST })
  @IsString()
  @IsNotEmpty({ message: 'Say what the customer complains of.' })
  @MaxLength(TEXT_MOST)
  complaint: string;

  @ApiPropertyOptional({ maxLength: TEXT_MOST })
  @IsOptional()
  @IsString()
  @MaxLength(TEXT_MOST)
  earlierWork?: string;

  @ApiPropertyOptional({ description: 'Family whose circuit is taken; either this or a netlist.' })
  @IsOptional()
  @IsInt()
  familyId?: number;

  @ApiPropertyOptional({ type: 'object', additionalProperties: true })
  @IsOptional()
  @IsObject({ message: 'The netlist must be a JSON object.' })
  netlist?: Record<string, unknown>;

  @ApiPropertyOptional({ minimum: LINE_VOLTS_LEAST, maximum: LINE_VOLTS_MOST })
  @IsOptional()
  @IsNumber({}, { message: LINE_SENTENCE })
  @Min(LINE_VOLTS_LEAST, { message: LINE_SENTENCE })
  @Max(LINE_VOLTS_MOST, { message: LINE_SENTENCE })
  lineVolts?: number;
}

export class ChangeCaseDto {
  @ApiProperty({ description: 'Version the change was made from.' })
  @IsInt()
  version: number;

  @ApiPropertyOptional({ maxLength: SET_MOST })
  @IsOptional()
  @IsString()
  @IsNotEmpty({ message: 'Say what set it is.' })
  @MaxLength(SET_MOST)
  set?: string;

  @ApiPropertyOptional({ maxLength: TEXT_MOST })
  @IsOptional()
  @IsString()
  @IsNotEmpty({ message: 'Say what the customer complains of.' })
  @MaxLength(TEXT_MOST)
  complaint?: string;

  @ApiPropertyOptional({ maxLength: TEXT_MOST })
  @IsOptional()
  @IsString()
  @MaxLength(TEXT_MOST)
  earlierWork?: string;

  @ApiPropertyOptional({ minimum: LINE_VOLTS_LEAST, maximum: LINE_VOLTS_MOST })
  @IsOptional()
  @IsNumber({}, { message: LINE_SENTENCE })
  @Min(LINE_VOLTS_LEAST, { message: LINE_SENTENCE })
  @Max(LINE_VOLTS_MOST, { message: LINE_SENTENCE })
  lineVolts?: number;

  @ApiPropertyOptional({ enum: CASE_STATES.filter((state) => state !== 'closed') })
  @IsOptional()
  @IsIn(CASE_STATES.filter((state) => state !== 'closed'), {
    message: 'Choose one of the open states; closing is a step of its own.',
  })
  state?: CaseState;

  @ApiPropertyOptional({ type: 'array', items: { type: 'object', additionalProperties: true } })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(AS_FOUND_MOST)
  @IsObject({ each: true })
  asFound?: Record<string, unknown>[];

  @ApiPropertyOptional({ type: 'object', additionalProperties: true })
  @IsOptional()
  @IsObject({ message: 'The netlist must be a JSON object.' })
  netlist?: Record<string, unknown>;

  @ApiPropertyOptional({ description: 'Who has it on the bench.' })
  @IsOptional()
  @IsInt()
  assignedToId?: number;
}

export class ConfirmFaultDto {
  @ApiProperty()
  @IsString()
  @MaxLength(24)
  part: string;

  @ApiProperty({ enum: FAULT_MODES, enumName: 'FaultMode' })
  @IsIn(FAULT_MODES, { message: 'Choose how the part had failed.' })
  mode: FaultMode;
}

export class CloseCaseDto {
  @ApiProperty({ enum: OUTCOMES, enumName: 'Outcome' })
  @IsIn(OUTCOMES, { message: 'Say how the case ended: repaired, no fault found, or not repaired.' })
  outcome: Outcome;

  @ApiProperty({ type: [ConfirmFaultDto] })
  @IsArray()
  @ArrayMaxSize(12)
  @ValidateNested({ each: true })
  @Type(() => ConfirmFaultDto)
  confirmedFaults: ConfirmFaultDto[];

  @ApiPropertyOptional({ maxLength: TEXT_MOST })
  @IsOptional()
  @IsString()
  @MaxLength(TEXT_MOST)
  note?: string;
}
