/** Units a person may write or read a value in. */
export type Unit = 'V' | 'A' | 'Ω' | 'F' | 'H' | 'W' | 'Hz';

/** Multipliers by letter; `m` and `M` differ, `K` counts as `k`. */
export const PREFIXES: Readonly<Record<string, number>> = {
  p: 1e-12,
  n: 1e-9,
  u: 1e-6,
  µ: 1e-6,
  μ: 1e-6,
  m: 1e-3,
  k: 1e3,
  K: 1e3,
  M: 1e6,
  G: 1e9,
};

/** Prefixes written out, as in `2.2 meg` or `20 microfarads`. */
const PREFIX_WORDS: [RegExp, string][] = [
  [/^mega?/i, 'M'],
  [/^kilo?/i, 'k'],
  [/^milli/i, 'm'],
  [/^micro/i, 'u'],
  [/^nano/i, 'n'],
  [/^pico/i, 'p'],
];

/** Microfarads and picofarads as drawings of the tube era write them. */
const OLD_FARADS: [RegExp, number][] = [
  [/^(?:mmfd?|[uµμ]{2}fd?)$/i, 1e-12],
  [/^mfd$/i, 1e-6],
];

const SPELLINGS: [RegExp, Unit][] = [
  [/^(?:ohms?|Ω|\u2126|R)$/i, 'Ω'],
  [/^(?:volts?|V)(?:\s*(?:AC|DC|RMS|p-?p))?$/i, 'V'],
  [/^(?:amperes?|amps?|A)$/i, 'A'],
  [/^(?:farads?|F)$/i, 'F'],
  [/^(?:henr(?:y|ies|ys)|H)$/i, 'H'],
  [/^(?:watts?|W)$/i, 'W'],
  [/^(?:hertz|Hz|cps)$/i, 'Hz'],
];

/** What each unit is called, the quantity it measures, and a value as one would type it. */
export const UNIT_WORDS: Readonly<
  Record<Unit, { name: string; quantity: string; example: string }>
> = {
  V: { name: 'volts', quantity: 'a voltage', example: '118.4' },
  A: { name: 'amps', quantity: 'a current', example: '150mA' },
  Ω: { name: 'ohms', quantity: 'a resistance', example: '4.7k' },
  F: { name: 'farads', quantity: 'a capacitance', example: '0.1u' },
  H: { name: 'henries', quantity: 'an inductance', example: '8' },
  W: { name: 'watts', quantity: 'a power', example: '10' },
  Hz: { name: 'hertz', quantity: 'a frequency', example: '60' },
};

/** The unit a word stands for, without any prefix. */
export function unitOf(word: string): Unit | undefined {
  return SPELLINGS.find(([pattern]) => pattern.test(word))?.[1];
}

/** Multiplier and unit behind a number, and the prefix letter when there was one. */
export interface Tail {
  factor: number;
  unit: Unit;
  prefix: string;
  /** False when only a prefix was written, such as `4.7k`. */
  hasUnit: boolean;
}

/**
 * Reads what stands behind a number: nothing, a prefix, a unit or both.
 *
 * @param wanted the field's unit, taken when none is written.
 * @returns null when it makes no sense.
 */
export function readTail(tail: string, wanted: Unit): Tail | null {
  if (tail === '') return { factor: 1, unit: wanted, prefix: '', hasUnit: false };
  const old = OLD_FARADS.find(([pattern]) => pattern.test(tail));
  if (old) return { factor: old[1], unit: 'F', prefix: '', hasUnit: true };
  const whole = unitOf(tail);
  if (whole) return { factor: 1, unit: whole, prefix: '', hasUnit: true };
  const written = PREFIX_WORDS.find(([pattern]) => pattern.test(tail));
  const prefix = written ? written[1] : tail[0];
  const factor = Object.hasOwn(PREFIXES, prefix) ? PREFIXES[prefix] : undefined;
  if (factor === undefined) return null;
  const rest = tail.replace(written ? written[0] : /^./, '').trim();
  if (rest === '') return { factor, unit: wanted, prefix, hasUnit: false };
  const unit = unitOf(rest);
  return unit ? { factor, unit, prefix, hasUnit: true } : null;
}
