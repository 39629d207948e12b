import { type DiagnosisResult } from '@engine/diagnosis-types';
import { type ConfirmedFault } from '@/lib/api-model';

/** Below this, the first suspect is no more than a guess and is not offered. */
const LIKELY = 0.5;

/**
 * Offers the faults of the first suspect when a case is closed.
 *
 * @param result newest answer of the engine, if there is one.
 * @returns its faults; none while no suspect stands out.
 */
export function confirmableFaults(result: DiagnosisResult | undefined): ConfirmedFault[] {
  const first = result?.suspects[0];
  if (!first || first.probability < LIKELY) return [];
  return first.faults.map(({ part, mode }) => ({ part, mode }));
}
