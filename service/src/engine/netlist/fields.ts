import type { PartKind } from './types';

/** How one field of a part is checked. */
export interface FieldRule {
  type: 'positive' | 'not-negative' | 'fraction' | 'number' | 'text' | 'word' | 'node' | 'phase';
  isRequired?: boolean;
  /** Words allowed, for `word`. */
  words?: readonly string[];
}

const COMMON: Record<string, FieldRule> = {
  tolerance: { type: 'fraction' },
  assembly: { type: 'text' },
  note: { type: 'text' },
};
const NEEDED: FieldRule = { type: 'positive', isRequired: true };
const POSITIVE: FieldRule = { type: 'positive' };

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
    coldRatio: POSITIVE,
    exponent: POSITIVE,
  },
  lamp: {
    ...COMMON,
    volts: NEEDED,
    amps: NEEDED,
    lamp: { type: 'text' },
    coldRatio: POSITIVE,
    exponent: POSITIVE,
  },
  thermistor: {
    ...COMMON,
    hotOhms: NEEDED,
    coldOhms: NEEDED,
    amps: NEEDED,
    exponent: { type: 'number' },
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
  load: { ...COMMON, amps: NEEDED, volts: NEEDED, exponent: POSITIVE },
};

/** What is wrong with one field's value, as a sentence; null when nothing is. */
export function fieldProblem(name: string, rule: FieldRule, value: unknown): string | null {
  const isNumber = typeof value === 'number' && Number.isFinite(value);
  switch (rule.type) {
    case 'positive':
      return isNumber && value > 0 ? null : `“${name}” must be a number above zero.`;
    case 'not-negative':
      return isNumber && value >= 0 ? null : `“${name}” must be a number, zero or more.`;
    case 'fraction':
      return isNumber && value > 0 && value < 1
        ? null
        : `“${name}” must be a fraction between 0 and 1, such as 0.1 for ±10 %.`;
    case 'number':
      return isNumber ? null : `“${name}” must be a number.`;
    case 'phase':
      return value === 0 || value === 180 ? null : `“${name}” must be 0 or 180 degrees.`;
    case 'word':
      return typeof value === 'string' && rule.words!.includes(value)
        ? null
        : `“${name}” must be one of ${rule.words!.join(', ')}.`;
    default:
      return typeof value === 'string' && value.trim() !== '' && value.length <= 200
        ? null
        : `“${name}” must be a text of 1 to 200 characters.`;
  }
}
