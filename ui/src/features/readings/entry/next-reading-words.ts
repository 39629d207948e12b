import { type NextReading } from '@engine/diagnosis-types';
import { type Netlist } from '@engine/netlist/types';
import { labelForReading } from '@/lib/bench/places';
import { isPoweredReading } from '@/lib/bench/takes';

/**
 * Names a suggested reading with the state of the set it needs.
 *
 * @returns the engine's own label where it gives one, else "ohms across R1B, power off".
 */
export function nextReadingInWords(
  netlist: Pick<Netlist, 'points' | 'reference'>,
  next: NextReading,
): string {
  if (next.label) return next.label;
  const state = isPoweredReading(next.take) ? 'powered' : 'power off';
  return `${labelForReading(netlist, next)}${next.take === 'sign' ? '' : `, ${state}`}`;
}
