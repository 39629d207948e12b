import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import {
  ArrayMaxSize,
  IsArray,
  IsIn,
  IsInt,
  IsNotEmpty,
  IsObject,
  IsOptional,
  IsString,
  MaxLength,
} from 'class-validator';
import { FAULT_MODES, type FaultMode, type Netlist } from '../../engine';
import { SET_KINDS, type SetKind } from '../family.model';
import { FAMILY_NAME_MOST, NOTE_MOST, TAG_MOST, TAGS_MOST } from '../family.limits';

export class CreateFamilyDto {
  @ApiProperty({ maxLength: FAMILY_NAME_MOST })
  @IsString()
  @IsNotEmpty({ message: 'Give the family a name.' })
  @MaxLength(FAMILY_NAME_MOST)
  name: string;

  @ApiProperty({ enum: SET_KINDS, enumName: 'SetKind' })
  @IsIn(SET_KINDS, { message: 'Choose what kind of set it is.' })
  kind: SetKind;

  @ApiPropertyOptional({ type: [String] })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(TAGS_MOST)
  @IsString({ each: true })
  @MaxLength(TAG_MOST, { each: true })
  tags?: string[];

  @ApiProperty({ type: 'object', additionalProperties: true, description: 'Netlist document.' })
  @IsObject({ message: 'The netlist must be a JSON object.' })
  netlist: Record<string, unknown>;

  @ApiPropertyOptional({ maxLength: NOTE_MOST })
  @IsOptional()
  @IsString()
  @MaxLength(NOTE_MOST)
  note?: string;
}

export class CreateFamilyVersionDto {
  @ApiProperty({ type: 'object', additionalProperties: true })
  @IsObject({ message: 'The netlist must be a JSON object.' })
  netlist: Record<string, unknown>;

  @ApiProperty({ maxLength: NOTE_MOST })
  @IsString()
  @IsNotEmpty({ message: 'Say why this version is made.' })
  @MaxLength(NOTE_MOST)
  note: string;

  @ApiProperty({ description: 'Version this one was made from.' })
  @IsInt()
  basedOn: number;
}

export class FamilySummaryDto {
  @ApiProperty() id: number;
  @ApiProperty() name: string;
  @ApiProperty({ enum: SET_KINDS, enumName: 'SetKind' }) kind: SetKind;
  @ApiProperty({ type: [String] }) tags: string[];
  @ApiProperty() description: string;
  @ApiProperty() version: number;
  @ApiProperty() parts: number;
  @ApiProperty({ type: [String], description: 'Tube types the circuit names.' }) tubes: string[];
  @ApiProperty({ description: 'Solved cases on this family.' }) solvedCases: number;
}

export class FamilyVersionDto {
  @ApiProperty() version: number;
  @ApiProperty({ description: 'Who made it.' }) by: string;
  @ApiProperty({ format: 'date-time' }) at: string;
  @ApiProperty() note: string;
}

export class SolvedFaultDto {
  @ApiProperty() part: string;
  @ApiProperty({ enum: FAULT_MODES, enumName: 'FaultMode' }) mode: FaultMode;
  @ApiProperty() count: number;
}

export class SolvedDto {
  @ApiProperty() cases: number;
  @ApiProperty({ type: [SolvedFaultDto] }) faults: SolvedFaultDto[];
}

export class FamilyAbilities {
  @ApiProperty() write: boolean;
}

export class FamilyDto extends FamilySummaryDto {
  @ApiProperty({ type: 'object', additionalProperties: true }) netlist: Netlist;
  @ApiProperty({ type: [FamilyVersionDto] }) versions: FamilyVersionDto[];
  @ApiProperty({ type: SolvedDto }) solved: SolvedDto;
  @ApiProperty({ type: FamilyAbilities }) abilities: FamilyAbilities;
}
