import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { type AsFound, FAULT_MODES, type FaultMode, type Netlist } from '../../engine';
import type { Person } from '../../people/person.model';
import { type Case, CASE_STATES, type CaseState, type Outcome, OUTCOMES } from '../case.model';
import { canCloseCase, canEditCase, canRecord, canReopenCase } from '../case.policy';

export class PersonRefDto {
  @ApiProperty() id: number;
  @ApiProperty() name: string;
}

export class ConfirmedFaultDto {
  @ApiProperty() part: string;
  @ApiProperty({ enum: FAULT_MODES, enumName: 'FaultMode' }) mode: FaultMode;
}

export class CaseSummaryDto {
  @ApiProperty() id: number;
  @ApiProperty({ example: '2026-0042' }) number: string;
  @ApiProperty() set: string;
  @ApiProperty() complaint: string;
  @ApiProperty({ enum: CASE_STATES, enumName: 'CaseState' }) state: CaseState;
  @ApiProperty({ format: 'date-time' }) openedAt: string;
  @ApiProperty({ format: 'date-time' }) changedAt: string;
  @ApiProperty({ type: PersonRefDto }) openedBy: PersonRefDto;
  @ApiProperty({ type: PersonRefDto, nullable: true }) assignedTo: PersonRefDto | null;
  @ApiProperty({ type: Number, nullable: true }) familyId: number | null;
  @ApiProperty({ type: String, nullable: true }) familyName: string | null;
  @ApiProperty({ description: 'Readings taken so far.' }) readings: number;
}

export class CaseAbilities {
  @ApiProperty() edit: boolean;
  @ApiProperty() record: boolean;
  @ApiProperty() close: boolean;
  @ApiProperty() reopen: boolean;
}

export class CaseDto extends CaseSummaryDto {
  @ApiProperty() earlierWork: string;
  @ApiProperty({ type: Number, nullable: true }) familyVersion: number | null;
  @ApiProperty({ type: 'object', additionalProperties: true }) netlist: Netlist;
  @ApiProperty({ type: 'array', items: { type: 'object', additionalProperties: true } })
  asFound: AsFound[];
  @ApiProperty({ type: Number, nullable: true, description: 'Line voltage of the day.' })
  lineVolts: number | null;
  @ApiProperty({ description: 'Whether the asking person has acknowledged the cautions.' })
  cautionAcknowledged: boolean;
  @ApiProperty({ type: [ConfirmedFaultDto] }) confirmedFaults: ConfirmedFaultDto[];
  @ApiPropertyOptional({ enum: OUTCOMES, enumName: 'Outcome', nullable: true })
  outcome: Outcome | null;
  @ApiProperty({ type: String, nullable: true }) closingNote: string | null;
  @ApiProperty({ type: String, format: 'date-time', nullable: true }) closedAt: string | null;
  @ApiProperty({ description: 'Send it back with a change.' }) version: number;
  @ApiProperty({ type: CaseAbilities }) abilities: CaseAbilities;
}

function reference(person: Person | null | undefined): PersonRefDto | null {
  return person ? { id: person.id, name: person.name } : null;
}

/** A case as it stands in lists. */
export function presentSummary(found: Case, readings: number): CaseSummaryDto {
  return {
    id: found.id,
    number: found.number,
    set: found.setName,
    complaint: found.complaint,
    state: found.state,
    openedAt: found.createdAt.toISOString(),
    changedAt: found.updatedAt.toISOString(),
    openedBy: reference(found.openedBy) ?? { id: found.openedById, name: '' },
    assignedTo: reference(found.assignedTo),
    familyId: found.familyId,
    familyName: found.family?.name ?? null,
    readings,
  };
}

/** A case whole, as the asking person may see and change it. */
export function presentCase(
  found: Case,
  actor: Person,
  readings: number,
  cautionAcknowledged: boolean,
): CaseDto {
  return {
    ...presentSummary(found, readings),
    earlierWork: found.earlierWork,
    familyVersion: found.familyVersion,
    netlist: found.netlist,
    asFound: found.asFound,
    lineVolts: found.lineVolts,
    cautionAcknowledged,
    confirmedFaults: (found.confirmedFaults ?? []).map(({ part, mode }) => ({ part, mode })),
    outcome: found.outcome,
    closingNote: found.closingNote,
    closedAt: found.closedAt?.toISOString() ?? null,
    version: found.version,
    abilities: {
      edit: canEditCase(actor, found),
      record: canRecord(actor, found),
      close: canCloseCase(actor, found),
      reopen: canReopenCase(actor, found),
    },
  };
}
