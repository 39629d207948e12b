import { type Take } from '@engine/netlist/types';
import { formatQuantity } from '@engine/units';
import { SEEN_WORDS, TAKE_WORDS } from './takes';
import { type CaseReading } from './case-reading';

/**
 * Writes a value of a reading with its unit.
 *
 * @param value SI value, `OL` for over range, null or undefined for none.
 * @param take kind of reading, which gives the unit.
 * @returns "118.4 V", "4.7 kΩ", "OL", or "–" for none.
 */
export function takenInWords(value: number | 'OL' | null | undefined, take: Take): string {
  if (value === 'OL') return 'OL';
  const { unit } = TAKE_WORDS[take];
  if (value === null || value === undefined || !unit) return '–';
  return formatQuantity(value, unit, 4);
}

/** Below this a computed value is nothing: volts or amps that no bench meter would show. */
const NOTHING = { V: 0.005, A: 5e-7, Ω: 0 };

/**
 * Writes a computed value with its unit, to the three figures that tolerances leave.
 *
 * @param value SI value, null for over range.
 * @param take kind of reading, which gives the unit.
 * @returns "96.2 V", "0 V" for what is too little for a meter, "OL" for null.
 */
export function computedInWords(value: number | null, take: Take): string {
  if (value === null) return 'OL';
  const unit = TAKE_WORDS[take].unit as keyof typeof NOTHING | null;
  if (!unit) return '–';
  // Above a hundred a meter shows tenths, and the difference of two such values matters.
  const digits = Math.abs(value) >= 100 ? 4 : 3;
  return formatQuantity(Math.abs(value) < NOTHING[unit] ? 0 : value, unit, digits);
}

/**
 * Writes the two ends of an interval.
 *
 * @returns "82.5 to 91.4 V", or with both units where they differ: "980 Ω to 1.05 kΩ".
 */
export function intervalInWords(low: number, high: number, take: Take): string {
  const { unit } = TAKE_WORDS[take];
  if (!unit) return '–';
  const [from, to] = [computedInWords(low, take), computedInWords(high, take)];
  const [number, word] = from.split(' ');
  return to.endsWith(` ${word}`) || from.startsWith('0 ')
    ? `${number} to ${to}`
    : `${from} to ${to}`;
}

/** Writes what was read: a value with its unit, or what was seen. */
export function readingInWords(reading: Pick<CaseReading, 'take' | 'value' | 'seen'>): string {
  if (reading.seen) return SEEN_WORDS[reading.seen].word.toLowerCase();
  return takenInWords(reading.value, reading.take);
}
