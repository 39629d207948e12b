import { type Reading } from '@engine/netlist/types';

/** A reading as a case keeps it. */
export interface CaseReading extends Reading {
  id: number;
  /** Id given where it was typed, so that sending it twice stores it once. */
  clientId?: string;
  note?: string;
  /** Name of the person who took it. */
  takenBy?: string;
  /** When it was taken, ISO 8601. */
  takenAt?: string;
  /** True when a later reading at the same place counts instead. */
  isReplaced?: boolean;
  /** True when it was taken back. */
  isWithdrawn?: boolean;
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
    .sort((a, b) => a - b)
    .join(',');
}
