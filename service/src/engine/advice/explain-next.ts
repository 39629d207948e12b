import type { NextReading } from '../diagnosis-types';
import type { Ranked } from '../ranking/posterior';
import type { RatedCandidate } from './next-readings';
import { faultWords } from './words';

/** Name of a suspect inside a sentence. */
function nameOf({ set }: Ranked): string {
  if (set.atoms.length === 0) return 'a healthy set';
  return set.atoms.map(({ ref, mode }) => faultWords(ref, mode)).join(' with ');
}

/**
 * Tells what a candidate would settle: the likeliest two suspects whose readings would lie clearly
 * apart.
 */
function whyOf(candidate: RatedCandidate, suspects: readonly Ranked[]): string {
  const { outlook } = candidate;
  let best: [number, number] | null = null;
  let bestWeight = 0;
  for (let i = 0; i < suspects.length && i < 12; i += 1) {
    for (let j = i + 1; j < suspects.length && j < 20; j += 1) {
      const x = outlook[i];
      const y = outlook[j];
      const byOver = Math.abs(x.over - y.over);
      const apart = Math.abs(x.mean - y.mean) / Math.hypot(x.sigma, y.sigma);
      const separation = Math.max(byOver, 1 - Math.exp(-0.25 * apart * apart));
      const weight = separation * Math.min(suspects[i].probability, suspects[j].probability);
      if (separation > 0.5 && weight > bestWeight) {
        bestWeight = weight;
        best = [i, j];
      }
    }
  }
  if (!best) return 'It would tell little that is not known already.';
  return `It tells ${nameOf(suspects[best[0]])} from ${nameOf(suspects[best[1]])}.`;
}

/** A candidate as it is told to a person. */
export function nextReading(
  candidate: RatedCandidate,
  suspects: readonly Ranked[],
  wordsOf: (candidate: RatedCandidate) => string,
): NextReading {
  const { take, at, part, bits, minutes } = candidate;
  return {
    take,
    ...(at ? { at } : {}),
    ...(part ? { part } : {}),
    label: wordsOf(candidate),
    bits,
    minutes,
    why: whyOf(candidate, suspects),
  };
}
