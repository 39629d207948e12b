import { applyFaults, type SettledFault } from '../faults/apply';
import type { Reading } from '../netlist/types';
import { blankValues, type BranchValues, healthyValues } from '../solver/branch-values';
import type { Circuit } from '../solver/circuit';
import { type Predictions, Predictor } from '../solver/predictor';
import { type ReadingSpec, specOf } from '../solver/reading-spec';
import { SETTINGS } from '../tolerances';
import { type Likelihood, LikelihoodModel, type Observation } from './likelihood';
import { signLog } from './signs';

/** Log density of a slip: anything the meter can show, evenly over volts or over ln(ohms). */
function wideDensity(circuit: Circuit, spec: ReadingSpec): number {
  if (spec.isLog) return -Math.log(19);
  if (spec.take === 'amps') return -Math.log(2);
  return -Math.log(1.2 * Math.max(circuit.lineVolts, 50) * (spec.take === 'ac-volts' ? 1 : 3));
}

/** Readings as the likelihood sees them. */
export function observationsOf(circuit: Circuit, readings: readonly Reading[]): Observation[] {
  return readings.map((reading) => {
    const spec = specOf(circuit, reading);
    const isOver = reading.value === 'OL';
    const value = typeof reading.value === 'number' ? reading.value : Number.NaN;
    return {
      spec,
      isOver,
      y: spec.isLog
        ? Math.log(Math.max(0, value) + SETTINGS.ohmsOffset)
        : spec.take === 'dc-volts'
          ? value
          : Math.abs(value),
      logWide: wideDensity(circuit, spec),
    };
  });
}

/**
 * Scores settled fault sets against the readings of one case. It remembers what it has scored.
 */
export class Scorer {
  readonly predictor: Predictor;
  readonly observations: Observation[];
  readonly healthy: BranchValues;
  readonly likelihood: LikelihoodModel;
  /** Fault sets solved and scored. */
  scored = 0;
  /** Fault sets that did not settle and were dropped. */
  dropped = 0;
  /** The case's readings by place; one list, since predictions are remembered for it. */
  readonly specs: readonly ReadingSpec[];
  private readonly signs: Reading[];
  private readonly sigmas: Float64Array;
  /** Written over by every score, so that scoring allocates little. */
  private readonly values: BranchValues;
  private readonly predictions: Predictions;
  private readonly spread: Float64Array;
  private readonly memory = new Map<string, Likelihood | null>();

  constructor(
    readonly circuit: Circuit,
    readonly readings: readonly Reading[],
  ) {
    this.predictor = new Predictor(circuit);
    this.observations = observationsOf(circuit, readings);
    this.specs = this.observations.map(({ spec }) => spec);
    this.signs = readings.filter(({ take }) => take === 'sign');
    this.likelihood = new LikelihoodModel(this.observations);
    this.healthy = healthyValues(circuit);
    this.values = blankValues(circuit.branches.length);
    this.predictions = this.predictor.blank(readings.length);
    this.spread = new Float64Array(readings.length);
    this.sigmas = new Float64Array(this.predictor.width);
    circuit.parameters.forEach((parameter, i) => {
      this.sigmas[i] = parameter.sigma;
    });
  }

  /** Standard deviations of all parameters for one fault set, cells of unknown values included. */
  sigmasOf(faults: readonly SettledFault[]): Float64Array {
    const base = this.circuit.parameters.length;
    this.sigmas.fill(0, base);
    faults.forEach(({ width }, slot) => {
      // An even spread over a cell of ln(value) has σ = width/√12.
      if (width !== undefined) this.sigmas[base + slot] = width / Math.sqrt(12);
    });
    return this.sigmas;
  }

  /** Predicts any readings under a fault set; null when it does not settle. */
  predict(faults: readonly SettledFault[], specs: readonly ReadingSpec[]): Predictions | null {
    return this.predictor.predict(applyFaults(this.healthy, this.circuit, faults), specs, faults);
  }

  /**
   * Scores a fault set and tells the standard deviation of every reading under it.
   *
   * @returns null when the set does not settle; `sigma` is written over by the next call.
   */
  scoreWithSpread(
    faults: readonly SettledFault[],
  ): { like: Likelihood; sigma: Float64Array } | null {
    const values = applyFaults(this.healthy, this.circuit, faults, this.values);
    const predictions = this.predictor.predict(values, this.specs, faults, this.predictions);
    if (!predictions) return null;
    const like = this.likelihood.score(predictions, this.sigmasOf(faults));
    const n = this.observations.length;
    for (let r = 0; r < n; r += 1) {
      this.spread[r] = Math.sqrt(this.likelihood.covariance[r * n + r]);
    }
    return { like, sigma: this.spread };
  }

  /**
   * Scores a fault set with everything worked out for it alone; slow where a rectifier block is
   * part of it, and the same as `score` where none is.
   */
  scoreExactly(faults: readonly SettledFault[]): Likelihood | null {
    if (!this.predictor.waves) return this.score(faults);
    const values = applyFaults(this.healthy, this.circuit, faults, this.values);
    const predictions = this.predictor.predict(values, this.specs, faults, this.predictions, true);
    if (!predictions) return null;
    const result = this.likelihood.score(predictions, this.sigmasOf(faults));
    if (this.signs.length > 0) result.log += signLog(this.predictor, values, faults, this.signs);
    return result;
  }

  /** What the case's readings should be under a fault set, without spreads; false when it does not settle. */
  means(faults: readonly SettledFault[], mean: Float64Array): boolean {
    const values = applyFaults(this.healthy, this.circuit, faults, this.values);
    return this.predictor.means(values, this.specs, faults, mean);
  }

  /** Log-likelihood of the case's readings under a fault set; null when it does not settle. */
  score(faults: readonly SettledFault[]): Likelihood | null {
    const key = faults.map(keyOf).join('|');
    const known = this.memory.get(key);
    if (known !== undefined) return known;
    const values = applyFaults(this.healthy, this.circuit, faults, this.values);
    const predictions = this.predictor.predict(values, this.specs, faults, this.predictions);
    let result: Likelihood | null = null;
    if (predictions) {
      result = this.likelihood.score(predictions, this.sigmasOf(faults));
      if (this.signs.length > 0) {
        result.log += signLog(this.predictor, values, faults, this.signs);
      }
      this.scored += 1;
    } else this.dropped += 1;
    this.memory.set(key, result);
    return result;
  }
}

function keyOf({ part, mode, value, volts, amps }: SettledFault): string {
  return `${part}${mode}${value ?? ''}${volts ?? ''},${amps ?? ''}`;
}
