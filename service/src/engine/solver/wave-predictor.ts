import type { SettledFault } from '../faults/apply';
import { applyFaults } from '../faults/apply';
import { SETTINGS } from '../tolerances';
import { type BranchValues, blankValues, healthyValues } from './branch-values';
import type { Circuit } from './circuit';
import { ColdNetwork } from './cold-network';
import { Law } from './laws';
import type { Predictions } from './predictor';
import type { ReadingSpec } from './reading-spec';
import { WaveNetwork, type WaveSolution } from './wave-network';
import { waveSensitivities } from './wave-sensitivities';

/** Solutions kept per case; each holds one number per reading. */
const MOST_KEPT = 20000;
/** A meter that pulls its node down by more than this factor is solved as part of the circuit. */
const MUCH_LOADED = 1.3;
/** A rail that fell below this share of its healthy value shows only millivolts of no meaning. */
const COLLAPSED = 0.01;

/** Readings of a waveform block as numbers, and the ohms behind each voltage for its meter. */
type Means = Float64Array;

/**
 * Predicts readings in blocks with rectifiers. A full solution takes about a millisecond, so
 * results are remembered by fault, and sensitivities are worked out in full only for a few
 * hypotheses: the others take those of the healthy set in proportion to their own readings.
 */
export class WavePredictor {
  readonly network: WaveNetwork;
  /** Periodic steady states solved so far. */
  solved = 0;
  private readonly loading: ColdNetwork;
  private readonly healthy: BranchValues;
  private readonly scratch: BranchValues;
  private readonly adjoint: Float64Array;
  private readonly lists = new WeakMap<readonly ReadingSpec[], ReadingList>();
  private list: ReadingList = newList([], []);

  constructor(private readonly circuit: Circuit) {
    this.network = new WaveNetwork(circuit);
    this.loading = new ColdNetwork(circuit);
    this.healthy = healthyValues(circuit);
    this.scratch = blankValues(circuit.branches.length);
    this.adjoint = new Float64Array(circuit.nodes.length);
  }

  /** True when a reading belongs to a waveform block. */
  isWave(spec: ReadingSpec): boolean {
    const { take, a, b, part } = spec;
    if (take === 'ohms' || take === 'lifted-ohms' || take === 'sign') return false;
    if (part >= 0) return this.circuit.isSteady[part] === 0;
    const isInside = (node: number) =>
      this.network.rowOf(node) > 0 && node !== this.circuit.hot && node !== this.circuit.return;
    return isInside(a) || isInside(b) || take === 'dc-volts' || take === 'ripple-volts';
  }

  /** Turns to a list of readings; what is remembered is remembered for each list by itself. */
  private about(specs: readonly ReadingSpec[]): ReadingList {
    if (specs === this.list.specs) return this.list;
    const known = this.lists.get(specs);
    this.list =
      known ??
      newList(
        specs,
        specs.map((_, r) => r).filter((r) => this.isWave(specs[r])),
      );
    this.lists.set(specs, this.list);
    return this.list;
  }

  /**
   * Fills the rows of waveform readings of a prediction.
   *
   * @param isExact works the sensitivities out for this very hypothesis.
   * @returns false when the block does not settle.
   */
  fill(
    specs: readonly ReadingSpec[],
    faults: readonly SettledFault[],
    out: Predictions,
    isExact: boolean,
  ): boolean {
    const { rows, exact: known } = this.about(specs);
    if (rows.length === 0) return true;
    const own = this.inBlock(faults);
    const means = isExact || own.length < 2 ? this.meansOf(own) : this.combined(own);
    const base = this.meansOf([]);
    if (!means || !base) return false;
    const { circuit } = this;
    const width = circuit.parameters.length;
    const key = keyOf(own);
    if (isExact && !known.has(key)) known.set(key, this.slopes(own, means));
    const exact = known.get(key);
    if (!known.has('')) known.set('', this.slopes([], base));
    const reference = known.get('')!;
    rows.forEach((r, i) => {
      out.mean[r] = means[i];
      out.shown[r] = means[i];
      const share = Math.abs(base[i]) > 1e-9 ? means[i] / base[i] : 0;
      for (let p = 0; p < width; p += 1) {
        out.sensitivity[r * out.width + p] = exact
          ? exact[i * width + p]
          : reference[i * width + p] * share;
      }
      const isDown = Math.abs(means[i]) < COLLAPSED * Math.abs(base[i]);
      const vague = isDown ? 0.3 * means[i] : SETTINGS.waveVagueness * means[i];
      const floor = isDown ? SETTINGS.collapsedVolts : SETTINGS.waveFloorVolts;
      out.stray[r] = vague * vague + floor * floor;
    });
    faults.forEach((fault, slot) => {
      if (fault.width === undefined || this.circuit.isSteady[fault.part]) return;
      const slope = this.slopeOf(fault);
      const alone = this.meansOf([fault]);
      if (!slope || !alone) return;
      rows.forEach((r, i) => {
        const share = own.length === 1 ? 1 : Math.abs(alone[i]) > 1e-9 ? means[i] / alone[i] : 0;
        out.sensitivity[r * out.width + width + slot] = slope[i] * share;
      });
    });
    return true;
  }

  /**
   * Fills only the means; two and more faults are taken as acting in proportion, which is rough but
   * needs no solution of its own.
   */
  roughMeans(
    specs: readonly ReadingSpec[],
    faults: readonly SettledFault[],
    mean: Float64Array,
  ): boolean {
    const { rows } = this.about(specs);
    if (rows.length === 0) return true;
    const own = this.inBlock(faults);
    const base = this.meansOf([]);
    if (!base) return false;
    const singles = own.map((fault) => this.meansOf([fault]));
    if (singles.some((single) => !single)) return false;
    rows.forEach((r, i) => {
      let value = base[i];
      for (const single of singles) {
        if (Math.abs(base[i]) > 1e-9) value *= single![i] / base[i];
        else value += single![i];
      }
      mean[r] = value;
    });
    return true;
  }

  /**
   * Readings under several faults of the block: solved in full once for their parts and modes, and
   * again where a value lies far from those solved; in between each fault acts in proportion.
   */
  private combined(faults: readonly SettledFault[]): Means | null {
    const key = faults.map(({ part, mode }) => `${part}${mode}`).join('|');
    const anchors = this.list.anchors.get(key) ?? [];
    this.list.anchors.set(key, anchors);
    const near = anchors.find((anchor) =>
      faults.every((fault, i) => isNear(fault, anchor.faults[i])),
    );
    if (!near) {
      const means = this.meansOf(faults);
      if (means) anchors.push({ faults: faults.slice(), means });
      return means;
    }
    const out = near.means.slice();
    for (let f = 0; f < faults.length; f += 1) {
      if (faults[f].value === near.faults[f].value) continue;
      const now = this.meansOf([faults[f]]);
      const then = this.meansOf([near.faults[f]]);
      if (!now || !then) return null;
      for (let i = 0; i < out.length; i += 1) {
        if (Math.abs(then[i]) > 1e-9) out[i] *= now[i] / then[i];
      }
    }
    return out;
  }

  private inBlock(faults: readonly SettledFault[]): SettledFault[] {
    return faults
      .filter(({ part }) => !this.circuit.isSteady[part])
      .sort((x, y) => x.part - y.part || (x.mode < y.mode ? -1 : 1));
  }

  /** Readings under some faults of the block, remembered. */
  private meansOf(faults: readonly SettledFault[]): Means | null {
    const key = keyOf(faults);
    const { means: kept } = this.list;
    const known = kept.get(key);
    if (known !== undefined) return known;
    if (kept.size > MOST_KEPT) kept.clear();
    const values = applyFaults(this.healthy, this.circuit, faults, this.scratch);
    const means = this.measure(values, 1);
    kept.set(key, means);
    return means;
  }

  /** Solves the block and reads every meter. */
  private measure(values: BranchValues, line: number): Means | null {
    const solution = this.network.solve(values, line);
    this.solved += 1;
    if (!solution) return null;
    const out = new Float64Array(this.list.rows.length);
    const { circuit, network, loading, adjoint } = this;
    let behindIs: 'direct' | 'alternating' | null = null;
    this.list.rows.forEach((r, i) => {
      const spec = this.list.specs[r];
      out[i] = readMeter(network, solution, spec, circuit);
      if (spec.take === 'amps') return;
      const kind = spec.take === 'dc-volts' ? 'direct' : 'alternating';
      if (behindIs !== kind) {
        if (!loading.solve(this.smallSignal(values, solution, kind === 'direct'))) return;
        behindIs = kind;
      }
      loading.response(spec.a, spec.b, adjoint);
      const factor = 1 + spec.meter.siemens * (adjoint[spec.a] - adjoint[spec.b]);
      const isInside = network.rowOf(spec.a) >= 0 && network.rowOf(spec.b) >= 0;
      if (factor < MUCH_LOADED || !isInside) {
        out[i] /= factor;
        return;
      }
      // A cut-off node is what the meter makes of it: solve with the meter in place.
      const { a, b, meter } = spec;
      const loaded = network.solve(values, line, { a, b, ohms: 1 / meter.siemens });
      this.solved += 1;
      if (loaded) out[i] = readMeter(network, loaded, spec, circuit);
      else out[i] /= factor;
    });
    return out;
  }

  /**
   * What a small current meets in every branch, direct or of line frequency: decides how far a
   * meter pulls a node down.
   */
  private smallSignal(
    values: BranchValues,
    { state, element }: WaveSolution,
    isDirect: boolean,
  ): Float64Array {
    const omega = 2 * Math.PI * this.circuit.hertz;
    return Float64Array.from(this.circuit.branches, (_, k) => {
      const [p0, p1, p2] = [values.p0[k], values.p1[k], values.p2[k]];
      switch (values.law[k]) {
        case Law.Ohmic:
          return p0;
        case Law.Hot:
          return p1 / p0;
        case Law.Ntc:
          return 1 / p0;
        case Law.Capacitor:
          return 1 / p2 + (isDirect ? 0 : 1 / Math.hypot(p1, 1 / (omega * p0)));
        case Law.Rectifier:
          // Averaged over a cycle, a conducting rectifier lets current through for a tenth of it.
          return (state.current(element[k]).mean > 1e-6 ? 0.1 / p1 : 0) + 1 / p2;
        case Law.Choke:
          return 1 / (isDirect ? p1 : Math.hypot(p1, omega * p0));
        case Law.Load:
          return (p2 * p0) / p1;
        default:
          return 1 / p1;
      }
    });
  }

  /**
   * Change of every reading per relative change of every parameter, at one hypothesis. A meter that
   * pulls its node down takes the change down with it.
   */
  private slopes(faults: readonly SettledFault[], means: Means): Float64Array {
    const { circuit, network, list } = this;
    const values = applyFaults(this.healthy, circuit, faults);
    const width = circuit.parameters.length;
    const solution = network.solve(values);
    this.solved += 1;
    if (!solution) return new Float64Array(list.rows.length * width);
    const specs = list.rows.map((r) => list.specs[r]);
    const out = waveSensitivities(circuit, network, values, solution, specs);
    specs.forEach((spec, i) => {
      const open = readMeter(network, solution, spec, circuit);
      const factor = Math.abs(open) > 1e-6 ? means[i] / open : 1;
      for (let p = 0; p < width; p += 1) out[i * width + p] *= factor;
    });
    return out;
  }

  /** Change of every reading per unit of ln(value) of one fault standing alone. */
  private slopeOf(fault: SettledFault): Float64Array | null {
    const up = this.meansOf([shifted(fault, 1)]);
    const down = this.meansOf([shifted(fault, -1)]);
    if (!up || !down) return null;
    return Float64Array.from(up, (value, i) => (value - down[i]) / (2 * fault.width!));
  }
}

/** What is remembered for one list of readings. */
interface ReadingList {
  specs: readonly ReadingSpec[];
  /** Places in the list of readings that belong to waveform blocks. */
  rows: number[];
  means: Map<string, Means | null>;
  /** Sensitivities worked out in full, by fault. */
  exact: Map<string, Float64Array>;
  /** Combinations solved in full, by parts and modes; their neighbours are taken in proportion. */
  anchors: Map<string, Anchor[]>;
}

function newList(specs: readonly ReadingSpec[], rows: number[]): ReadingList {
  return { specs, rows, means: new Map(), exact: new Map(), anchors: new Map() };
}

/** A combination of faults solved in full. */
interface Anchor {
  faults: SettledFault[];
  means: Means;
}

/** Cells between a value and one solved in full, within which proportion is good enough. */
const NEAR_CELLS = 3.2;

function isNear(x: SettledFault, y: SettledFault): boolean {
  if (x.volts !== y.volts || x.amps !== y.amps) return false;
  if (x.value === undefined || y.value === undefined) return true;
  return Math.abs(Math.log(x.value / y.value)) <= NEAR_CELLS * Math.min(x.width!, y.width!);
}

/** The same fault with its value one cell further up or down. */
function shifted(fault: SettledFault, cells: number): SettledFault {
  return { ...fault, value: fault.value! * Math.exp(cells * fault.width!) };
}

function keyOf(faults: readonly SettledFault[]): string {
  return faults
    .map(
      ({ part, mode, value, volts, amps }) =>
        `${part}${mode}${value === undefined ? '' : Math.log(value).toFixed(5)}${volts ?? ''},${amps ?? ''}`,
    )
    .join('|');
}

/** Averages below this are left over from rounding. */
const LEAST_VOLTS = 1e-5;

/** What a meter that draws nothing shows. */
export function readMeter(
  network: WaveNetwork,
  { state, element }: WaveSolution,
  { take, a, b, part }: ReadingSpec,
  circuit: Circuit,
): number {
  if (take === 'amps') {
    if (element[part] < 0) return 0;
    const current = state.current(element[part]);
    // On the line's side there is hardly a direct part; an AC ammeter is used there.
    return Math.abs(current.mean) < 0.3 * current.rms ? current.rms : current.mean;
  }
  const x = network.rowOf(a);
  const y = network.rowOf(b);
  if (x < 0 || y < 0) return take === 'ac-volts' && a === circuit.hot ? circuit.lineVolts : 0;
  if (take === 'dc-volts') {
    const { mean } = state.pair(x, y);
    return Math.abs(mean) < LEAST_VOLTS ? 0 : mean;
  }
  if (take === 'ripple-volts') return state.pairPeakToPeak(x, y);
  return state.pair(x, y).acRms;
}
