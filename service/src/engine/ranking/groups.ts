import type { Predictions } from '../solver/predictor';
import type { ScoredSet } from './fault-set';
import type { LikelihoodModel } from './likelihood';
import type { Scorer } from './scorer';

/** Readings may differ by this many standard deviations and still not tell two suspects apart. */
const SAME_WITHIN = 0.7;
/** And their likelihoods by this factor in ln. */
const SAME_LIKELIHOOD = 1.5;

/** Standard deviations of the last prediction scored. */
function spreadsOf(model: LikelihoodModel, count: number): Float64Array {
  return Float64Array.from({ length: count }, (_, r) => Math.sqrt(model.covariance[r * count + r]));
}

/**
 * Marks the suspects that the readings so far cannot tell apart.
 *
 * @param sets suspects, best first.
 * @returns one group number per set, from 1, numbered by first appearance.
 */
export function groupSets(scorer: Scorer, sets: readonly ScoredSet[]): number[] {
  const count = scorer.observations.length;
  const leaders: { set: ScoredSet; predictions: Predictions; spreads: Float64Array }[] = [];
  return sets.map((set) => {
    const predictions = scorer.predict(set.best, scorer.specs);
    if (!predictions) return leaders.length + 1;
    const found = leaders.findIndex(({ set: leader, predictions: other, spreads }) => {
      if (Math.abs(set.logLikelihood - leader.logLikelihood) > SAME_LIKELIHOOD) return false;
      for (let r = 0; r < count; r += 1) {
        const apart = Math.abs(predictions.mean[r] - other.mean[r]);
        if (apart > SAME_WITHIN * spreads[r]) return false;
      }
      return true;
    });
    if (found >= 0) return found + 1;
    scorer.likelihood.score(predictions, scorer.sigmasOf(set.best));
    return leaders.push({ set, predictions, spreads: spreadsOf(scorer.likelihood, count) });
  });
}
