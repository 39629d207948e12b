import { type Seen, type Take } from '@engine/netlist/types';
import { type Unit } from '@engine/units';

/** How one kind of reading is called and taken. */
export interface TakeWords {
  /** Column or row heading: "DC volts". */
  title: string;
  /** Within a sentence: "DC volts", "ohms with one end lifted". */
  phrase: string;
  /** Unit of the value; null for a look. */
  unit: Unit | null;
  /** True when the set is switched on for it. */
  isPowered: boolean;
}

/** Words for every kind of reading. */
export const TAKE_WORDS: Record<Take, TakeWords> = {
  'ac-volts': { title: 'AC volts', phrase: 'AC volts', unit: 'V', isPowered: true },
  'dc-volts': { title: 'DC volts', phrase: 'DC volts', unit: 'V', isPowered: true },
  'ripple-volts': { title: 'Ripple', phrase: 'ripple volts', unit: 'V', isPowered: true },
  amps: { title: 'Amps', phrase: 'amps', unit: 'A', isPowered: true },
  ohms: { title: 'Ohms', phrase: 'ohms', unit: 'Ω', isPowered: false },
  'lifted-ohms': {
    title: 'Ohms, lifted',
    phrase: 'ohms with one end lifted',
    unit: 'Ω',
    isPowered: false,
  },
  sign: { title: 'Looks', phrase: 'how it looks', unit: null, isPowered: false },
};

/** Words for what can be seen or heard on a part, in the order they are offered. */
export const SEEN_WORDS: Record<Seen, { word: string; isPowered: boolean }> = {
  'looks-good': { word: 'Looks good', isPowered: false },
  burnt: { word: 'Burnt', isPowered: false },
  cracked: { word: 'Cracked', isPowered: false },
  bulging: { word: 'Bulging', isPowered: false },
  leaking: { word: 'Leaking', isPowered: false },
  dark: { word: 'Dark', isPowered: true },
  glows: { word: 'Glows', isPowered: true },
  hums: { word: 'Hums', isPowered: true },
  cold: { word: 'Cold', isPowered: true },
  warm: { word: 'Warm', isPowered: true },
  hot: { word: 'Hot', isPowered: true },
};

/**
 * Says whether a reading is taken with the set switched on.
 *
 * @param take kind of reading.
 * @param seen for a look, what was seen: a glow needs power, a crack does not.
 * @returns true when the cautions come first.
 */
export function isPoweredReading(take: Take, seen?: Seen): boolean {
  if (take === 'sign' && seen) return SEEN_WORDS[seen].isPowered;
  return TAKE_WORDS[take].isPowered;
}
