import { type Reading } from '@engine/netlist/types';

/** A reading as a case keeps it. */
export interface CaseReading extends Reading {
  id: string;
  /** Id given where it was typed, so that sending it twice stores it once. */
  clientId?: string | null;
  meterId?: string | null;
  note?: string | null;
  /** When it was taken, ISO 8601. */
  takenAt?: string;
  /** Name of the person who took it. */
  takenBy?: { id: string; name: string } | null;
  /** Set when a later reading at the same place replaced it. */
  replacedAt?: string | null;
  /** Set when it was taken back. */
  withdrawnAt?: string | null;
}

/**
 * Names the state of a case's readings, so that what is computed from them is asked for again when they change.
 *
 * @param readings readings as the service keeps them.
 * @returns a string that differs whenever a reading was added, replaced or withdrawn.
 */
export function revisionOfReadings(readings: readonly Pick<CaseReading, 'id'>[]): string {
  return readings
    .map((reading) => reading.id)
    .sort()
    .join(',');
}
