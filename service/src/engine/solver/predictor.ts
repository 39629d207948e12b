import type { SettledFault } from '../faults/apply';
import { SETTINGS } from '../tolerances';
import type { BranchValues } from './branch-values';
import type { Circuit } from './circuit';
import { ColdNetwork } from './cold-network';
import { Law } from './laws';
import type { ReadingSpec } from './reading-spec';
import { RmsNetwork } from './rms-network';
import { WavePredictor } from './wave-predictor';

/** Room for the unknown values of this many faults behind the circuit's own parameters. */
export const FAULT_SLOTS = 6;

/** What the meter should show under one hypothesis, for a list of readings. */
export interface Predictions {
  /** Readings by rows: volts, amps, or ln(ohms + offset). */
  mean: Float64Array;
  /** The same as the meter shows it: volts, amps, ohms. */
  shown: Float64Array;
  /** Row by row, change of `mean` per unit of each parameter; `width` columns. */
  sensitivity: Float64Array;
  width: number;
  /** Variance from stray pick-up, in the units of `mean`. */
  stray: Float64Array;
}

/**
 * Predicts readings and how they move with everything that is uncertain. Each voltage is solved
 * with its own meter in place; sensitivities come from the adjoint network (S. W. Director,
 * R. A. Rohrer, IEEE Trans. Circuit Theory CT-16 (1969) 318-323).
 */
export class Predictor {
  readonly rms: RmsNetwork;
  readonly cold: ColdNetwork;
  /** Null when the circuit has no block with a rectifier or reactance. */
  readonly waves: WavePredictor | null;
  private readonly adjoint: Float64Array;

  constructor(readonly circuit: Circuit) {
    this.rms = new RmsNetwork(circuit);
    this.cold = new ColdNetwork(circuit);
    const waves = new WavePredictor(circuit);
    this.waves = waves.network.isNeeded ? waves : null;
    this.adjoint = new Float64Array(circuit.nodes.length);
  }

  /** Columns of a sensitivity row. */
  get width(): number {
    return this.circuit.parameters.length + FAULT_SLOTS;
  }

  /** Room for the predictions of this many readings. */
  blank(count: number): Predictions {
    const { width } = this;
    return {
      mean: new Float64Array(count),
      shown: new Float64Array(count),
      sensitivity: new Float64Array(count * width),
      width,
      stray: new Float64Array(count),
    };
  }

  /**
   * Predicts readings under one hypothesis.
   *
   * @param faults the hypothesis behind the values; slots of unknown values follow their order.
   * @param into predictions to write over, made for as many readings.
   * @param isExact works out in full how readings of waveform blocks move; slow.
   * @returns null when the set does not settle.
   */
  predict(
    values: BranchValues,
    specs: readonly ReadingSpec[],
    faults: readonly SettledFault[],
    into?: Predictions,
    isExact = false,
  ): Predictions | null {
    const { width } = this;
    const out = into ?? this.blank(specs.length);
    if (into) {
      into.sensitivity.fill(0);
      into.stray.fill(0);
    }
    let hasPower = false;
    let hasCold = false;
    for (let r = 0; r < specs.length; r += 1) {
      const row = out.sensitivity.subarray(r * width, (r + 1) * width);
      switch (specs[r].take) {
        case 'ohms':
          if (!hasCold && !this.cold.solve(values.cold)) return null;
          hasCold = true;
          this.predictOhms(values, specs[r], r, row, out);
          break;
        case 'lifted-ohms':
          this.predictLifted(values, specs[r], r, row, out);
          break;
        case 'sign':
          break;
        default:
          if (this.waves?.isWave(specs[r])) break;
          if (!hasPower && !this.rms.solve(values)) return null;
          hasPower = true;
          if (specs[r].take === 'amps') this.predictAmps(values, specs[r], r, row, out);
          else this.predictVolts(values, specs[r], r, row, out);
      }
    }
    if (this.waves && !this.waves.fill(specs, faults, out, isExact)) return null;
    return out;
  }

  /**
   * What the meter should show, without sensitivities; a few times quicker than `predict`.
   * Several faults in one waveform block are taken as acting in proportion.
   *
   * @param mean receives volts, amps or ln(ohms + offset), one per spec.
   * @returns false when the set does not settle.
   */
  means(
    values: BranchValues,
    specs: readonly ReadingSpec[],
    faults: readonly SettledFault[],
    mean: Float64Array,
  ): boolean {
    const { rms, cold, adjoint } = this;
    let hasPower = false;
    let hasCold = false;
    for (let r = 0; r < specs.length; r += 1) {
      const { take, a, b, part, meter } = specs[r];
      if (take === 'ohms') {
        if (!hasCold && !cold.solve(values.cold)) return false;
        hasCold = true;
        cold.response(a, b, adjoint);
        mean[r] = Math.log(Math.max(0, adjoint[a] - adjoint[b]) + SETTINGS.ohmsOffset);
      } else if (take === 'lifted-ohms') {
        const siemens = Math.max(values.cold[part], SETTINGS.leastSiemens);
        mean[r] = Math.log(1 / siemens + SETTINGS.ohmsOffset);
      } else if (take !== 'sign' && !this.waves?.isWave(specs[r])) {
        if (!hasPower && !rms.solve(values)) return false;
        hasPower = true;
        if (take === 'amps') mean[r] = Math.abs(rms.amps[part]);
        else {
          rms.response(a, b, adjoint);
          const loading = 1 + meter.siemens * (adjoint[a] - adjoint[b]);
          mean[r] = Math.abs((rms.volts[a] - rms.volts[b]) / loading);
        }
      }
    }
    return this.waves?.roughMeans(specs, faults, mean) ?? true;
  }

  private predictVolts(
    values: BranchValues,
    spec: ReadingSpec,
    r: number,
    row: Float64Array,
    out: Predictions,
  ): void {
    const { circuit, rms, adjoint } = this;
    rms.response(spec.a, spec.b, adjoint);
    const ownOhms = adjoint[spec.a] - adjoint[spec.b];
    const loading = 1 + spec.meter.siemens * ownOhms;
    const volts = (rms.volts[spec.a] - rms.volts[spec.b]) / loading;
    const sign = volts < 0 ? -1 : 1;
    out.mean[r] = Math.abs(volts);
    out.shown[r] = out.mean[r];
    const strayVolts = (SETTINGS.strayAmps * ownOhms) / loading;
    out.stray[r] = strayVolts * strayVolts;
    let line = (spec.a === circuit.hot ? 1 : 0) - (spec.b === circuit.hot ? 1 : 0);
    for (let k = 0; k < circuit.branches.length; k += 1) {
      const { a, b } = circuit.branches[k];
      const across = adjoint[a] - adjoint[b];
      if (rms.slope[k] === Infinity) continue;
      if (a === circuit.hot) line += adjoint[b] / rms.slope[k];
      if (b === circuit.hot) line += adjoint[a] / rms.slope[k];
      if (across === 0) continue;
      // The meter's own current shifts the branch a little.
      const shift = across * spec.meter.siemens * volts;
      const amps = rms.amps[k] - shift / rms.slope[k];
      const branchVolts = rms.volts[a] - rms.volts[b] - shift;
      this.addPartials(values, k, amps, branchVolts, (sign * across) / loading, row);
    }
    row[circuit.lineParameter] += (sign * line * circuit.lineVolts) / loading;
  }

  private predictAmps(
    values: BranchValues,
    spec: ReadingSpec,
    r: number,
    row: Float64Array,
    out: Predictions,
  ): void {
    const { circuit, rms, adjoint } = this;
    const own = spec.part;
    rms.response(spec.a, spec.b, adjoint);
    const sign = rms.amps[own] < 0 ? -1 : 1;
    out.mean[r] = Math.abs(rms.amps[own]);
    out.shown[r] = out.mean[r];
    let line = 0;
    for (let k = 0; k < circuit.branches.length; k += 1) {
      const { a, b } = circuit.branches[k];
      if (rms.slope[k] === Infinity) continue;
      const across = (adjoint[a] - adjoint[b]) / rms.slope[own] - (k === own ? 1 : 0);
      if (a === circuit.hot) line += adjoint[b] / rms.slope[own] / rms.slope[k];
      if (b === circuit.hot) line += adjoint[a] / rms.slope[own] / rms.slope[k];
      if (across === 0) continue;
      this.addPartials(values, k, rms.amps[k], rms.volts[a] - rms.volts[b], sign * across, row);
    }
    if (spec.a === circuit.hot) line += 1 / rms.slope[own];
    if (spec.b === circuit.hot) line -= 1 / rms.slope[own];
    row[circuit.lineParameter] += sign * line * circuit.lineVolts;
  }

  /**
   * Adds what one branch's uncertainties do to a powered reading: −across·∂i/∂θ at fixed voltage.
   */
  private addPartials(
    values: BranchValues,
    k: number,
    amps: number,
    branchVolts: number,
    across: number,
    row: Float64Array,
  ): void {
    const { circuit, rms } = this;
    const { part, isLeak } = circuit.branches[k];
    const perOhms = across * amps;
    if (values.scaledBy[k] >= 0) row[circuit.parameters.length + values.scaledBy[k]] += perOhms;
    const state = values.state[k];
    if (state === 1) row[circuit.openParameter] += perOhms;
    if (state !== 0 || isLeak) return;
    const value = circuit.valueParameter[part];
    switch (values.law[k]) {
      case Law.Ohmic:
        row[value] += perOhms;
        break;
      case Law.Hot:
        row[value] -= perOhms;
        if (rms.isCold[k]) row[circuit.secondParameter[part]] -= perOhms;
        else {
          const ratio = Math.abs(branchVolts) / values.p0[k];
          const shared =
            circuit.parts[part].kind === 'lamp' ? circuit.lampExponent : circuit.heaterExponent;
          row[shared] -= perOhms * Math.log(Math.max(ratio, 1e-6));
        }
        break;
      default:
        if (rms.isCold[k]) row[circuit.secondParameter[part]] += perOhms;
        else row[value] += (across * branchVolts) / rms.slope[k];
    }
  }

  private predictOhms(
    values: BranchValues,
    spec: ReadingSpec,
    r: number,
    row: Float64Array,
    out: Predictions,
  ): void {
    const { circuit, cold, adjoint } = this;
    cold.response(spec.a, spec.b, adjoint);
    const ohms = Math.max(0, adjoint[spec.a] - adjoint[spec.b]);
    out.shown[r] = ohms;
    out.mean[r] = Math.log(ohms + SETTINGS.ohmsOffset);
    const scale = 1 / (ohms + SETTINGS.ohmsOffset);
    for (let k = 0; k < circuit.branches.length; k += 1) {
      if (values.cold[k] === 0) continue;
      const { a, b } = circuit.branches[k];
      const across = adjoint[a] - adjoint[b];
      if (across === 0) continue;
      this.addColdPartials(values, k, across * across * values.cold[k] * scale, row);
    }
  }

  private predictLifted(
    values: BranchValues,
    spec: ReadingSpec,
    r: number,
    row: Float64Array,
    out: Predictions,
  ): void {
    const k = spec.part;
    const ohms = values.cold[k] > 0 ? 1 / values.cold[k] : 1 / SETTINGS.leastSiemens;
    out.shown[r] = ohms;
    out.mean[r] = Math.log(ohms + SETTINGS.ohmsOffset);
    if (values.cold[k] > 0) {
      this.addColdPartials(values, k, ohms / (ohms + SETTINGS.ohmsOffset), row);
    }
  }

  /** Adds what one branch's cold resistance does to an ohms reading. */
  private addColdPartials(
    values: BranchValues,
    k: number,
    perOhms: number,
    row: Float64Array,
  ): void {
    const { circuit } = this;
    const { part, isLeak } = circuit.branches[k];
    if (values.scaledBy[k] >= 0) row[circuit.parameters.length + values.scaledBy[k]] += perOhms;
    const state = values.state[k];
    if (state === 1) row[circuit.openParameter] += perOhms;
    if (state !== 0 || isLeak) return;
    if (values.law[k] === Law.Hot) {
      row[circuit.valueParameter[part]] -= perOhms;
      row[circuit.secondParameter[part]] -= perOhms;
    } else if (values.law[k] === Law.Ntc) row[circuit.secondParameter[part]] += perOhms;
    else row[circuit.valueParameter[part]] += perOhms;
  }
}
