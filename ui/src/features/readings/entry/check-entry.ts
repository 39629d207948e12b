import { type Take } from '@engine/netlist/types';
import { parseQuantity } from '@engine/units';
import { TAKE_WORDS } from '@/lib/bench/takes';

export type CheckedEntry = { ok: true; value: number | 'OL' } | { ok: false; message: string };

/** Most that a bench meter with its usual leads can show; volts, amps. */
const MOST = { V: 5_000, A: 50 };

/**
 * Reads what was typed for one reading and refuses what no meter shows.
 *
 * @param text value with or without its unit: `118.4`, `4.7k`, `OL`.
 * @param take kind of reading, which gives the unit.
 * @returns the value in SI units, or a sentence that says what is wrong and what to do.
 */
export function checkEntry(text: string, take: Take): CheckedEntry {
  const { unit } = TAKE_WORDS[take];
  if (!unit) return { ok: false, message: 'Choose what was seen from the list.' };
  const parsed = parseQuantity(text, unit);
  if (!parsed.ok) return parsed;
  const { value } = parsed;
  if (value === 'OL') {
    if (unit === 'Ω') return { ok: true, value };
    return {
      ok: false,
      message: 'OL is for ohms. Choose a higher range and enter what the meter shows then.',
    };
  }
  if (unit === 'Ω' && value < 0) {
    return {
      ok: false,
      message: 'Ohms below zero: is there still a charge? Discharge and measure again.',
    };
  }
  // A digital meter shows a few counts below zero on a dead circuit; the service takes those.
  if ((take === 'ac-volts' || take === 'ripple-volts') && value < -0.5) {
    return { ok: false, message: 'AC and ripple are never below zero. Was this DC volts?' };
  }
  if (unit !== 'Ω' && Math.abs(value) > MOST[unit as 'V' | 'A']) {
    return {
      ok: false,
      message: `More than ${MOST[unit as 'V' | 'A'].toLocaleString('en')} ${unit} is not possible here. Check the decimal point and the unit.`,
    };
  }
  return { ok: true, value };
}
