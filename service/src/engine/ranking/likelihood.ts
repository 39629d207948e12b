import type { Predictions } from '../solver/predictor';
import type { ReadingSpec } from '../solver/reading-spec';
import { SETTINGS } from '../tolerances';
import { normalTail } from './normal';

/** One reading as the likelihood sees it. */
export interface Observation {
  spec: ReadingSpec;
  /** Volts, amps, or ln(ohms + offset); NaN for OL. */
  y: number;
  isOver: boolean;
  /** Log density of the wide alternative that a slip has. */
  logWide: number;
}

/** Log-likelihood of all readings, and which of them had to be called slips. */
export interface Likelihood {
  log: number;
  /** 1 for a reading that only counts as a slip. */
  slips: Uint8Array;
  slipCount: number;
}

const LOG_2PI = Math.log(2 * Math.PI);
const LOG_SOUND = Math.log(1 - SETTINGS.slipChance);
const LOG_SLIP = Math.log(SETTINGS.slipChance);
/** A meter at a wrong place shows OL this often. Assumption. */
const OVER_BY_SLIP = 0.2;
/** Below this χ² no reading can be worth calling a slip. */
const QUIET = 8;
/** Spread of ln(ohms) around the over-range limit. */
const OVER_SPREAD = 0.05;

/** Probability that the meter shows OL for a reading predicted at `mean` = ln(ohms + offset). */
export function overChance(mean: number, spread: number, overOhms: number): number {
  const sigma = Math.hypot(spread, OVER_SPREAD);
  return normalTail((Math.log(overOhms) - mean) / sigma);
}

/** Variance of the meter on one reading, in the units of `mean`. */
export function meterVariance(spec: ReadingSpec, shown: number): number {
  const sigma = spec.meter.sigma(Math.abs(shown));
  const scaled = spec.isLog ? sigma / (shown + SETTINGS.ohmsOffset) : sigma;
  return scaled * scaled;
}

/**
 * Scores hypotheses against one list of readings: a multivariate normal with covariance
 * S·D·Sᵀ + meter variance, in which any reading may also be a slip with a wide density. Which ones
 * are slips is found greedily, worst first.
 */
export class LikelihoodModel {
  /** Covariance of the last prediction scored, n×n. */
  readonly covariance: Float64Array;
  private readonly size: number;
  private readonly factor: Float64Array;
  private readonly inverse: Float64Array;
  private readonly precision: Float64Array;
  private readonly pull: Float64Array;
  private readonly white: Float64Array;
  private readonly isOut: Uint8Array;
  private readonly residual: Float64Array;
  private readonly kept: Int32Array;
  private scaled: Float64Array = new Float64Array(0);

  constructor(readonly observations: readonly Observation[]) {
    const n = observations.length;
    this.size = n;
    this.factor = new Float64Array(n * n);
    this.inverse = new Float64Array(n * n);
    this.precision = new Float64Array(n * n);
    this.pull = new Float64Array(n);
    this.white = new Float64Array(n);
    this.isOut = new Uint8Array(n);
    this.residual = new Float64Array(n);
    this.kept = new Int32Array(n);
    this.covariance = new Float64Array(n * n);
  }

  /**
   * Log-likelihood of the readings under one prediction.
   *
   * @param sigmas standard deviation of every parameter, `predictions.width` long.
   */
  score(predictions: Predictions, sigmas: Float64Array): Likelihood {
    const { size, observations, residual, kept } = this;
    const slips = new Uint8Array(size);
    let slipCount = 0;
    let log = 0;
    let count = 0;
    this.fillCovariance(predictions, sigmas);
    for (let r = 0; r < size; r += 1) {
      const { spec, isOver, y } = observations[r];
      if (spec.take === 'sign') continue;
      if (isOver) {
        const spread = Math.sqrt(this.covariance[r * size + r]);
        const chance = overChance(predictions.mean[r], spread, spec.meter.overOhms);
        const sound = (1 - SETTINGS.slipChance) * chance;
        const slip = SETTINGS.slipChance * OVER_BY_SLIP;
        if (slip > sound) {
          slips[r] = 1;
          slipCount += 1;
        }
        log += Math.log(sound + slip);
        continue;
      }
      residual[r] = y - predictions.mean[r];
      kept[count] = r;
      count += 1;
    }
    const { chi2, logDet } = this.factorKept(count);
    if (chi2 <= QUIET) {
      log += -0.5 * (chi2 + logDet + count * LOG_2PI) + count * LOG_SOUND;
      return { log, slips, slipCount };
    }
    this.invertKept(count);
    return this.dropSlips(count, chi2, logDet, { log, slips, slipCount });
  }

  /** Fills the covariance of all readings under one prediction. */
  private fillCovariance(predictions: Predictions, sigmas: Float64Array): void {
    const { size, covariance, observations } = this;
    const { width, sensitivity, stray, shown } = predictions;
    if (this.scaled.length < size * width) this.scaled = new Float64Array(size * width);
    const { scaled } = this;
    // Only columns that move some reading are kept: a cold reading knows nothing of the line.
    let used = 0;
    for (let p = 0; p < width; p += 1) {
      if (sigmas[p] === 0) continue;
      let isUsed = false;
      for (let r = 0; r < size; r += 1) {
        const value = sensitivity[r * width + p];
        scaled[r * width + used] = value * sigmas[p];
        if (value !== 0) isUsed = true;
      }
      if (isUsed) used += 1;
    }
    for (let i = 0; i < size; i += 1) {
      const left = i * width;
      for (let j = 0; j <= i; j += 1) {
        const right = j * width;
        let sum = 0;
        for (let p = 0; p < used; p += 1) sum += scaled[left + p] * scaled[right + p];
        covariance[i * size + j] = sum;
        covariance[j * size + i] = sum;
      }
      covariance[i * size + i] += stray[i] + meterVariance(observations[i].spec, shown[i]);
    }
  }

  /** Cholesky factor of the kept rows; χ² of their residuals and ln of the determinant. */
  private factorKept(count: number): { chi2: number; logDet: number } {
    const { size, covariance, factor, residual, kept, white } = this;
    let chi2 = 0;
    let logDet = 0;
    for (let i = 0; i < count; i += 1) {
      for (let j = 0; j <= i; j += 1) {
        let sum = covariance[kept[i] * size + kept[j]];
        for (let k = 0; k < j; k += 1) sum -= factor[i * size + k] * factor[j * size + k];
        if (i === j) {
          const diagonal = Math.sqrt(Math.max(sum, 1e-18));
          factor[i * size + i] = diagonal;
          logDet += 2 * Math.log(diagonal);
        } else factor[i * size + j] = sum / factor[j * size + j];
      }
      let w = residual[kept[i]];
      for (let k = 0; k < i; k += 1) w -= factor[i * size + k] * white[k];
      w /= factor[i * size + i];
      white[i] = w;
      chi2 += w * w;
    }
    return { chi2, logDet };
  }

  /** Precision matrix of the kept rows from their Cholesky factor, and precision × residual. */
  private invertKept(count: number): void {
    const { size, factor, inverse, precision, pull, residual, kept } = this;
    for (let c = 0; c < count; c += 1) {
      for (let i = c; i < count; i += 1) {
        let sum = i === c ? 1 : 0;
        for (let k = c; k < i; k += 1) sum -= factor[i * size + k] * inverse[k * size + c];
        inverse[i * size + c] = sum / factor[i * size + i];
      }
    }
    for (let i = 0; i < count; i += 1) {
      for (let j = 0; j <= i; j += 1) {
        let sum = 0;
        for (let k = i; k < count; k += 1) sum += inverse[k * size + i] * inverse[k * size + j];
        precision[i * size + j] = sum;
        precision[j * size + i] = sum;
      }
    }
    for (let i = 0; i < count; i += 1) {
      let sum = 0;
      for (let j = 0; j < count; j += 1) sum += precision[i * size + j] * residual[kept[j]];
      pull[i] = sum;
    }
  }

  /**
   * Calls readings slips, the one that gains most first, until none gains. Reading i given all
   * others is normal with variance 1/P_ii; taking it out is a rank-one change of the precision P.
   */
  private dropSlips(count: number, chi2: number, logDet: number, so: Likelihood): Likelihood {
    const { size, precision, pull, kept, observations, isOut } = this;
    isOut.fill(0);
    let left = count;
    for (;;) {
      let best = -1;
      let bestGain = 0;
      for (let i = 0; i < count; i += 1) {
        if (isOut[i]) continue;
        const own = precision[i * size + i];
        const given = -0.5 * ((pull[i] * pull[i]) / own + LOG_2PI - Math.log(own));
        const gain = LOG_SLIP + observations[kept[i]].logWide - (given + LOG_SOUND);
        if (gain > bestGain) {
          bestGain = gain;
          best = i;
        }
      }
      if (best < 0) break;
      const own = precision[best * size + best];
      chi2 -= (pull[best] * pull[best]) / own;
      logDet += Math.log(own);
      const share = pull[best] / own;
      isOut[best] = 1;
      for (let i = 0; i < count; i += 1) {
        if (isOut[i]) continue;
        const coupling = precision[i * size + best];
        pull[i] -= coupling * share;
        const scale = coupling / own;
        for (let j = 0; j <= i; j += 1) {
          if (isOut[j]) continue;
          const entry = precision[i * size + j] - scale * precision[j * size + best];
          precision[i * size + j] = entry;
          precision[j * size + i] = entry;
        }
      }
      so.slips[kept[best]] = 1;
      so.slipCount += 1;
      so.log += LOG_SLIP + observations[kept[best]].logWide;
      left -= 1;
    }
    so.log += -0.5 * (Math.max(0, chi2) + logDet + left * LOG_2PI) + left * LOG_SOUND;
    return so;
  }
}
