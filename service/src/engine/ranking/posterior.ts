import type { ScoredSet } from './fault-set';
import { logSumExp } from './normal';

/** A fault set with its share of the probability. */
export interface Ranked {
  set: ScoredSet;
  probability: number;
}

/**
 * Turns scores into probabilities that sum to 1 together with what was left unscored.
 *
 * @param unscored estimated share of sets never scored in full.
 */
export function rank(sets: readonly ScoredSet[], unscored: number): Ranked[] {
  const total = logSumExp(sets.map(({ score }) => score));
  return sets.map((set) => ({
    set,
    probability: Math.exp(set.score - total) * (1 - unscored),
  }));
}

/** Total probability that each part is bad, likeliest first. */
export function partProbabilities(
  ranked: readonly Ranked[],
  refs: readonly string[],
): { part: string; probability: number }[] {
  const sums = new Map(refs.map((ref) => [ref, 0]));
  for (const { set, probability } of ranked) {
    for (const { ref } of set.atoms) sums.set(ref, (sums.get(ref) ?? 0) + probability);
  }
  return [...sums]
    .map(([part, probability]) => ({ part, probability: Math.min(1, probability) }))
    .sort((x, y) => y.probability - x.probability || (x.part < y.part ? -1 : 1));
}
