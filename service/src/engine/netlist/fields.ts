import { nodeProblem } from './names';
import type { PartKind } from './types';

/** How one field of a part is checked. */
export interface FieldRule {
  type: 'positive' | 'not-negative' | 'fraction' | 'number' | 'text' | 'word' | 'node' | 'phase';
  isRequired?: boolean;
  /** Words allowed, for `word`. */
  words?: readonly string[];
  /** Bounds of a number; beyond them no part of this trade lies and no solver holds. */
  least?: number;
  most?: number;
}

/** Bounds of every number that states none of its own. */
const LEAST = 1e-15;
const MOST = 1e12;

const COMMON: Record<string, FieldRule> = {
  tolerance: { type: 'fraction' },
  assembly: { type: 'text' },
  note: { type: 'text' },
};
const NEEDED: FieldRule = { type: 'positive', isRequired: true };
const POSITIVE: FieldRule = { type: 'positive' };
/** I ∝ V^exponent: 1 is a resistance, 1.5 the space-charge law; heaters lie near 0.6. */
const EXPONENT: FieldRule = { type: 'positive', least: 0.1, most: 3 };
/** Published ratios of hot to cold ohms run from 2.7 to about 15. */
const COLD_RATIO: FieldRule = { type: 'positive', least: 1, most: 30 };

/** Fields of every kind of part besides `ref`, `kind` and `between`. */
export const FIELDS: Record<PartKind, Record<string, FieldRule>> = {
  resistor: {
    ...COMMON,
    ohms: NEEDED,
    watts: POSITIVE,
    make: { type: 'word', words: ['composition', 'film', 'wirewound'] },
  },
  heater: {
    ...COMMON,
    volts: NEEDED,
    amps: NEEDED,
    tube: { type: 'text' },
    cathode: { type: 'node' },
    coldRatio: COLD_RATIO,
    exponent: EXPONENT,
  },
  lamp: {
    ...COMMON,
    volts: NEEDED,
    amps: NEEDED,
    lamp: { type: 'text' },
    coldRatio: COLD_RATIO,
    exponent: EXPONENT,
  },
  thermistor: {
    ...COMMON,
    hotOhms: NEEDED,
    coldOhms: NEEDED,
    amps: NEEDED,
    exponent: { type: 'number', least: -6, most: 0 },
  },
  switch: { ...COMMON, ohms: POSITIVE },
  fuse: { ...COMMON, ohms: POSITIVE },
  joint: { ...COMMON, ohms: POSITIVE },
  capacitor: {
    ...COMMON,
    farads: NEEDED,
    volts: POSITIVE,
    make: { type: 'word', words: ['electrolytic', 'paper', 'film', 'ceramic', 'mica'] },
    esr: { type: 'not-negative' },
  },
  rectifier: {
    ...COMMON,
    make: { type: 'word', words: ['vacuum', 'selenium', 'silicon'] },
    dropVolts: { type: 'not-negative' },
    ohms: POSITIVE,
  },
  choke: { ...COMMON, henries: NEEDED, ohms: NEEDED },
  winding: { ...COMMON, volts: NEEDED, ohms: NEEDED, phase: { type: 'phase' } },
  load: { ...COMMON, amps: NEEDED, volts: NEEDED, exponent: EXPONENT },
};

/** What is wrong with one field's value, as a sentence; null when nothing is. */
export function fieldProblem(name: string, rule: FieldRule, value: unknown): string | null {
  const isNumber = typeof value === 'number' && Number.isFinite(value);
  const { least = LEAST, most = MOST } = rule;
  const isWithin = isNumber && Math.abs(value) <= most && (value === 0 || value >= least);
  const bounds = `“${name}” must lie between ${least} and ${most}.`;
  switch (rule.type) {
    case 'positive':
      if (!isNumber || value <= 0) return `“${name}” must be a number above zero.`;
      return isWithin ? null : bounds;
    case 'not-negative':
      if (!isNumber || value < 0) return `“${name}” must be a number, zero or more.`;
      return isWithin ? null : bounds;
    case 'fraction':
      return isNumber && value > 0 && value < 1
        ? null
        : `“${name}” must be a fraction between 0 and 1, such as 0.1 for ±10 %.`;
    case 'number':
      if (!isNumber) return `“${name}” must be a number.`;
      return value >= least && value <= most ? null : bounds;
    case 'phase':
      return value === 0 || value === 180 ? null : `“${name}” must be 0 or 180 degrees.`;
    case 'word':
      return typeof value === 'string' && rule.words!.includes(value)
        ? null
        : `“${name}” must be one of ${rule.words!.join(', ')}.`;
    case 'node':
      return nodeProblem(value, `“${name}”`)?.message ?? null;
    default:
      return typeof value === 'string' && value.trim() !== '' && value.length <= 200
        ? null
        : `“${name}” must be a text of 1 to 200 characters.`;
  }
}

/**
 * What is wrong between two fields that are right by themselves; null when nothing is.
 *
 * @param part fields of one part, of any shape.
 */
export function swappedField(
  kind: PartKind,
  part: Record<string, unknown>,
): { field: string; message: string } | null {
  const { hotOhms, coldOhms } = part;
  const isSwapped =
    kind === 'thermistor' &&
    typeof hotOhms === 'number' &&
    typeof coldOhms === 'number' &&
    coldOhms < hotOhms;
  return isSwapped
    ? {
        field: 'coldOhms',
        message: 'a string’s thermistor has more ohms cold than hot. Are the two values swapped?',
      }
    : null;
}
