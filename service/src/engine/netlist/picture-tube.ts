import type { Part } from './types';

/** Said in words on many drawings. */
const WORDS = /picture|\bcrt\b/i;
/** EIA type of a television picture tube: size, letters, P and its phosphor, 4 (white) or 22 (colour). */
const TYPE = /^\d{1,2}[A-Z]{1,3}P(?:4|22)[A-Z]*$/i;

/** True for the heater of a picture tube, by the words or the type number of its tube. */
export function isPictureTube(part: Part): boolean {
  if (part.kind !== 'heater' || part.tube === undefined) return false;
  return WORDS.test(part.tube) || TYPE.test(part.tube.trim());
}
