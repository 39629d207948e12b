import type { ScoredSet } from '../ranking/fault-set';
import { meterVariance } from '../ranking/likelihood';
import type { Scorer } from '../ranking/scorer';
import type { ReadingSpec } from '../solver/reading-spec';
import { SETTINGS } from '../tolerances';

/** A reading not yet taken, given those that were. */
export interface Conditional {
  /** Volts, amps, or ln(ohms + offset). */
  mean: number;
  /** Without the meter's own error. */
  variance: number;
  /** As the meter would show it. */
  shown: number;
}

/**
 * What further readings should show under one suspect, given the readings already taken: these
 * have told something about tolerances too, so the spread left is narrower than at first.
 *
 * @param specs the readings taken, in order, followed by the further ones.
 * @returns one entry per further reading, or null when the set does not settle.
 */
export function conditionOn(
  scorer: Scorer,
  set: ScoredSet,
  specs: readonly ReadingSpec[],
): Conditional[] | null {
  const { observations } = scorer;
  const taken = observations
    .map((_, r) => r)
    .filter((r) => {
      const { isOver, spec } = observations[r];
      return !isOver && spec.take !== 'sign' && !set.bestLikelihood.slips[r];
    });
  const n = taken.length;
  const all = scorer.predict(set.best, specs);
  if (!all) return null;
  const { width, sensitivity } = all;
  const sigmas = scorer.sigmasOf(set.best);
  const rows = new Float64Array(sensitivity.length);
  for (let at = 0; at < rows.length; at += width) {
    for (let p = 0; p < width; p += 1) rows[at + p] = sensitivity[at + p] * sigmas[p];
  }
  const dot = (x: number, y: number): number => {
    let sum = 0;
    for (let p = 0; p < width; p += 1) sum += rows[x * width + p] * rows[y * width + p];
    return sum;
  };
  // Cholesky factor of the covariance of the readings taken, and their whitened residuals.
  const factor = new Float64Array(n * n);
  const white = new Float64Array(n);
  for (let i = 0; i < n; i += 1) {
    const r = taken[i];
    for (let j = 0; j <= i; j += 1) {
      let sum = dot(r, taken[j]);
      if (i === j) sum += all.stray[r] + meterVariance(specs[r], all.shown[r]);
      for (let k = 0; k < j; k += 1) sum -= factor[i * n + k] * factor[j * n + k];
      factor[i * n + j] = i === j ? Math.sqrt(Math.max(sum, 1e-18)) : sum / factor[j * n + j];
    }
    let w = observations[r].y - all.mean[r];
    for (let k = 0; k < i; k += 1) w -= factor[i * n + k] * white[k];
    white[i] = w / factor[i * n + i];
  }
  const shared = new Float64Array(n);
  return specs.slice(observations.length).map((spec, c) => {
    const r = observations.length + c;
    let mean = all.mean[r];
    let variance = dot(r, r) + all.stray[r];
    for (let i = 0; i < n; i += 1) {
      let sum = dot(r, taken[i]);
      for (let k = 0; k < i; k += 1) sum -= factor[i * n + k] * shared[k];
      shared[i] = sum / factor[i * n + i];
      mean += shared[i] * white[i];
      variance -= shared[i] * shared[i];
    }
    variance = Math.max(variance, 1e-12);
    const shown = spec.isLog
      ? Math.max(0, Math.exp(mean) - SETTINGS.ohmsOffset)
      : Math.max(0, mean);
    return { mean: spec.isLog ? mean : Math.max(0, mean), variance, shown };
  });
}
