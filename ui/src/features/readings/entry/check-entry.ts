import { checkReading } from '@engine/netlist/readings';
import { type Netlist } from '@engine/netlist/types';
import { parseQuantity } from '@engine/units';
import { type Place } from '@/lib/bench/places';
import { TAKE_WORDS } from '@/lib/bench/takes';

export type CheckedEntry = { ok: true; value: number | 'OL' } | { ok: false; message: string };

/**
 * Reads what was typed for one reading and refuses what no meter shows on this circuit.
 *
 * The same check runs in the service, so what passes here is not refused there for its value.
 *
 * @param text value with or without its unit: `118.4`, `4.7k`, `OL`.
 * @param place kind of reading, which gives the unit, and where it is taken.
 * @param netlist circuit with the parts added as found.
 * @returns the value in SI units, or a sentence that says what is wrong and what to do.
 */
export function checkEntry(text: string, place: Place, netlist: Netlist): CheckedEntry {
  const { unit } = TAKE_WORDS[place.take];
  if (!unit) return { ok: false, message: 'Choose what was seen from the list.' };
  const parsed = parseQuantity(text, unit);
  if (!parsed.ok) return parsed;
  const [problem] = checkReading(netlist, { ...place, value: parsed.value });
  return problem ? { ok: false, message: problem.message } : { ok: true, value: parsed.value };
}
