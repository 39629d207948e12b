/** Units a person may write or read a value in. */
export type Unit = 'V' | 'A' | 'Ω' | 'F' | 'H' | 'W' | 'Hz';

/** A value as typed, understood or refused with a sentence. */
export type ParsedQuantity = { ok: true; value: number | 'OL' } | { ok: false; message: string };

/** Multipliers by letter; `m` and `M` differ, `K` counts as `k`. */
const PREFIXES: Record<string, number> = {
  p: 1e-12,
  n: 1e-9,
  u: 1e-6,
  µ: 1e-6,
  μ: 1e-6,
  m: 1e-3,
  '': 1,
  k: 1e3,
  K: 1e3,
  M: 1e6,
  G: 1e9,
};

/** Spellings of units, longest first. */
const UNIT_WORDS: [RegExp, Unit][] = [
  [/^(?:ohms?|Ω|Ω|R)$/i, 'Ω'],
  [/^(?:volts?|V|VAC|VDC|Vpp)$/i, 'V'],
  [/^(?:amperes?|amps?|A)$/i, 'A'],
  [/^(?:farads?|F)$/i, 'F'],
  [/^(?:henr(?:y|ies)|H)$/i, 'H'],
  [/^(?:watts?|W)$/i, 'W'],
  [/^(?:hertz|Hz|cps)$/i, 'Hz'],
];

const UNIT_NAMES: Record<Unit, string> = {
  V: 'volts',
  A: 'amps',
  Ω: 'ohms',
  F: 'farads',
  H: 'henries',
  W: 'watts',
  Hz: 'hertz',
};

const QUANTITIES: Record<Unit, string> = {
  V: 'a voltage',
  A: 'a current',
  Ω: 'a resistance',
  F: 'a capacitance',
  H: 'an inductance',
  W: 'a power',
  Hz: 'a frequency',
};

function refuse(message: string): ParsedQuantity {
  return { ok: false, message };
}

function unitOf(word: string): Unit | undefined {
  return UNIT_WORDS.find(([pattern]) => pattern.test(word))?.[1];
}

/** Splits what stands behind the number into prefix and unit; null when it makes no sense. */
function splitTail(tail: string, wanted: Unit): { factor: number; unit: Unit } | null {
  if (tail === '') return { factor: 1, unit: wanted };
  const whole = unitOf(tail);
  if (whole) return { factor: 1, unit: whole };
  const factor = PREFIXES[tail[0]];
  if (factor === undefined) return null;
  const rest = tail.slice(1).trim();
  if (rest === '') return { factor, unit: wanted };
  const unit = unitOf(rest);
  return unit ? { factor, unit } : null;
}

/** Settles commas: `1,5` is a decimal, `12,000` could be two things and is refused. */
function settleCommas(text: string): string | null {
  if (!text.includes(',')) return text;
  if (/^[+-]?\d{1,3}(,\d{3})+\.\d+$/.test(text)) return text.replaceAll(',', '');
  if (/^[+-]?\d{1,3}(,\d{3}){2,}$/.test(text)) return text.replaceAll(',', '');
  if (/^[+-]?\d+,\d+$/.test(text) && !/,\d{3}$/.test(text)) return text.replace(',', '.');
  return null;
}

/**
 * Reads a value the way people write it: `118.4`, `4.7k`, `4k7` and `2R2` (IEC 60062), `4.7 kΩ`,
 * `0.1u`, `100 µF`, `150mA`; `OL` for over range.
 *
 * @param text what was typed.
 * @param unit what the field wants; a bare number is taken in it.
 * @returns SI value, or a sentence that says what is wrong and what to write.
 */
export function parseQuantity(text: string, unit: Unit): ParsedQuantity {
  const typed = text.trim().replace(/\u2212/g, '-');
  if (typed === '') return refuse('Enter a value.');
  if (/^(?:O\.?L\.?|0\.?L\.?|overload|over)$/i.test(typed)) return { ok: true, value: 'OL' };
  // IEC 60062: the multiplier stands in the place of the decimal point.
  const rkm = /^([+-]?\d+)([pnuµμmkKMGRrVFH])(\d+)\s*(.*)$/.exec(typed);
  let digits: string;
  let tail: string;
  if (rkm) {
    const [, whole, letter, fraction, rest] = rkm;
    digits = `${whole}.${fraction}`;
    const isPlain = /[RrVFH]/.test(letter);
    tail = isPlain ? (letter.toUpperCase() === 'R' ? 'Ω' : letter) : `${letter}${rest}`;
    if (isPlain && rest !== '') tail = rest;
  } else {
    const match = /^([+-]?(?:\d[\d.,]*|\.\d+)(?:e[+-]?\d+)?)\s*(.*)$/i.exec(typed);
    if (!match) return refuse(`“${typed}” is not a number. Write it like 118.4, 4.7k or OL.`);
    const settled = settleCommas(match[1]);
    if (settled === null) {
      return refuse(
        `“${match[1]}” can be read in two ways. Use a point for decimals and no comma.`,
      );
    }
    digits = settled;
    tail = match[2].trim();
  }
  const number = Number(digits);
  if (!Number.isFinite(number)) {
    return refuse(`“${typed}” is not a number. Write it like 118.4, 4.7k or OL.`);
  }
  const end = splitTail(tail, unit);
  if (!end) {
    return refuse(
      `“${tail}” is no unit Ohmstead knows here. Write ${UNIT_NAMES[unit]}, such as ${example(unit)}.`,
    );
  }
  if (end.unit !== unit) {
    return refuse(`This is ${QUANTITIES[end.unit]}; the field wants ${UNIT_NAMES[unit]}.`);
  }
  return { ok: true, value: Number((number * end.factor).toPrecision(12)) };
}

function example(unit: Unit): string {
  return { V: '118.4', A: '150mA', Ω: '4.7k', F: '0.1u', H: '8', W: '10', Hz: '60' }[unit];
}

/** Prefixes a value is written with, by unit: farads go down to pico, ohms up to giga. */
const STEPS: [number, string][] = [
  [1e9, 'G'],
  [1e6, 'M'],
  [1e3, 'k'],
  [1, ''],
  [1e-3, 'm'],
  [1e-6, 'µ'],
  [1e-9, 'n'],
  [1e-12, 'p'],
];

/**
 * Writes a value for a person: `4.7 kΩ`, `100 µF`, `118.4 V`.
 *
 * @param digits significant figures, 3 when left out.
 */
export function formatQuantity(value: number | 'OL', unit: Unit, digits = 3): string {
  if (value === 'OL') return 'OL';
  if (value === 0) return `0 ${unit}`;
  const size = Math.abs(value);
  // Ohms and volts are said in whole units down to a tenth or so.
  const step =
    unit === 'Ω' && size < 1
      ? ([1, ''] as [number, string])
      : (STEPS.find(([factor]) => size >= factor * 0.9995) ?? STEPS[STEPS.length - 1]);
  const scaled = value / step[0];
  const text = String(
    Number(scaled.toPrecision(Math.max(digits, Math.abs(scaled) >= 100 ? 3 : digits))),
  );
  return `${text} ${step[1]}${unit}`;
}

/** Volts and amps of a rating such as `12.6V 150mA`; null when either is missing. */
export function parseRating(text: string): { volts: number; amps: number } | null {
  const words = text
    .trim()
    .split(/[\s,;/]+/)
    .filter(Boolean);
  let volts: number | undefined;
  let amps: number | undefined;
  for (const word of words) {
    const asVolts = /v/i.test(word) ? parseQuantity(word, 'V') : null;
    const asAmps = /a/i.test(word) ? parseQuantity(word, 'A') : null;
    if (asVolts?.ok && typeof asVolts.value === 'number') volts = asVolts.value;
    else if (asAmps?.ok && typeof asAmps.value === 'number') amps = asAmps.value;
    else return null;
  }
  return volts !== undefined && amps !== undefined ? { volts, amps } : null;
}
