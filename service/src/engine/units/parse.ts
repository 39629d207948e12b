import { readTail, type Tail, type Unit, UNIT_WORDS, unitOf } from './unit-words';

/** A value as typed, understood or refused with a sentence. */
export type ParsedQuantity = { ok: true; value: number | 'OL' } | { ok: false; message: string };

const OVER_RANGE = /^(?:O\.?L\.?|0\.?L\.?|overload|over)$/i;
const PLAIN = /^([+-]?(?:\d[\d.,]*|\.\d+)(?:e[+-]?\d+)?)\s*(.*)$/i;
/** IEC 60062: a letter stands in the place of the decimal point, as in 4k7, 2R2, R47. */
const LETTER_AS_POINT = /^(?:([+-]?\d+)([pnuµμmkKMGRrVAFH])|([+-]?)([pnuµμRr]))(\d+)(?!\.)\s*(.*)$/;

function refuse(message: string): ParsedQuantity {
  return { ok: false, message };
}

/** Settles commas: `1,5` is a decimal, `12,000` could be two things and is refused. */
function settleCommas(text: string): string | null {
  if (!text.includes(',')) return text;
  if (/^[+-]?[1-9]\d{0,2}(,\d{3})+\.\d+$/.test(text)) return text.replaceAll(',', '');
  if (/^[+-]?[1-9]\d{0,2}(,\d{3}){2,}$/.test(text)) return text.replaceAll(',', '');
  if (/^[+-]?0,\d+$/.test(text)) return text.replace(',', '.');
  if (/^[+-]?\d+,\d+$/.test(text) && !/,\d{3}$/.test(text)) return text.replace(',', '.');
  return null;
}

/** Digits and tail of `4k7 Ω`; null when the text is not written that way. */
function splitLetterAsPoint(typed: string): { digits: string; tail: string } | null {
  const match = LETTER_AS_POINT.exec(typed);
  if (!match) return null;
  const [, whole = `${match[3]}0`, letter = match[4], , , fraction, rest] = match;
  const unit = /[RrVAFH]/.test(letter) ? unitOf(letter) : undefined;
  if (!unit) return { digits: `${whole}.${fraction}`, tail: `${letter}${rest}` };
  // 12V6 is volts already; another unit behind it would be a slip of the keys.
  const isTwice = rest !== '' && unitOf(rest) !== unit;
  return { digits: `${whole}.${fraction}`, tail: isTwice ? `${letter}${rest}` : unit };
}

/** A sentence about a prefix that cannot be meant; null when it can. */
function prefixProblem(typed: string, { prefix, unit, hasUnit }: Tail): string | null {
  if (unit === 'Ω' && prefix === 'm' && !hasUnit) {
    return `“${typed}” would be milliohms. Write M for megohms, or the unit in full: mΩ.`;
  }
  if (unit === 'F' && /^m$/i.test(prefix) && hasUnit) {
    return `“${typed}” could be micro- or millifarads. Write u or µ for microfarads, as in 20u.`;
  }
  if ((prefix === 'M' || prefix === 'G') && unit !== 'Ω' && unit !== 'Hz') {
    const much = prefix === 'M' ? 'millions' : 'thousands of millions';
    return `“${typed}” would be ${much} of ${UNIT_WORDS[unit].name}. A small m stands for thousandths.`;
  }
  return null;
}

/**
 * Reads a value the way people write it: `118.4`, `4.7k`, `4k7` and `2R2` (IEC 60062), `4.7 kΩ`,
 * `0.1u`, `100 µF`, `20 mfd`, `150mA`; `OL` for over range.
 *
 * A comma is taken as a decimal sign or as a thousands sign only where it can be nothing else.
 *
 * @param text what was typed.
 * @param unit what the field wants; a bare number is taken in it.
 * @returns SI value, or a sentence that says what is wrong and what to write.
 */
export function parseQuantity(text: string, unit: Unit): ParsedQuantity {
  const typed = text.trim().replace(/\u2212/g, '-');
  if (typed === '') return refuse('Enter a value.');
  if (OVER_RANGE.test(typed)) return { ok: true, value: 'OL' };
  const notANumber = `“${typed}” is not a number. Write it like ${UNIT_WORDS[unit].example}${unit === 'Ω' ? ' or OL' : ''}.`;
  let { digits, tail } = splitLetterAsPoint(typed) ?? { digits: '', tail: '' };
  if (digits === '') {
    const match = PLAIN.exec(typed);
    if (!match) return refuse(notANumber);
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
  if (!Number.isFinite(number)) return refuse(notANumber);
  const end = readTail(tail, unit);
  if (!end) {
    const { name, example } = UNIT_WORDS[unit];
    return refuse(`“${tail}” is no unit Ohmstead knows here. Write ${name}, such as ${example}.`);
  }
  if (end.unit !== unit) {
    return refuse(
      `This is ${UNIT_WORDS[end.unit].quantity}; the field wants ${UNIT_WORDS[unit].name}.`,
    );
  }
  const problem = prefixProblem(typed, end);
  // Twelve figures: 4.7 × 1000 must come out as 4700, not 4700.000000000001.
  return problem
    ? refuse(problem)
    : { ok: true, value: Number((number * end.factor).toPrecision(12)) };
}

/** Volts and amps of a rating such as `12.6V 150mA` or `6.3 V, 0.3 A`; null unless both stand there once. */
export function parseRating(text: string): { volts: number; amps: number } | null {
  const words = text
    .trim()
    .replace(/(\d)\s+(?=[a-zµμ])/gi, '$1')
    .split(/[\s,;/]+/)
    .filter(Boolean);
  let volts: number | undefined;
  let amps: number | undefined;
  for (const word of words) {
    const asVolts = /v/i.test(word) ? parseQuantity(word, 'V') : null;
    const asAmps = /a/i.test(word) ? parseQuantity(word, 'A') : null;
    if (asVolts?.ok && typeof asVolts.value === 'number' && volts === undefined) {
      volts = asVolts.value;
    } else if (asAmps?.ok && typeof asAmps.value === 'number' && amps === undefined) {
      amps = asAmps.value;
    } else return null;
  }
  return volts !== undefined && amps !== undefined ? { volts, amps } : null;
}
