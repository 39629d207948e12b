import { dot } from './dense';
import type { Deviation } from './deviation';
import type { Disturbance } from './disturbance';
import { type Run, runsOf } from './runs';
import type { SteadyState } from './steady-state';

/** A reading to differentiate: a voltage from node a to node b, or an element's current. */
export type Request =
  | { what: 'mean' | 'rms' | 'acRms' | 'peakToPeak'; a: number; b: number }
  | { what: 'mean' | 'rms'; element: number };

/** A place within a step that has a weight. */
interface Instant {
  step: number;
  part: number;
  weight: number;
  /**
   * Set when a rectifier switches just there: a peak in a corner of the waveform moves along with
   * the switching, by `slope` per unit of time; `rate` is that of the rectifier's own voltage.
   */
  corner?: { rectifier: number; slope: number; rate: number };
}

/**
 * One reading as a weighted sum of a waveform's values and end slopes. Averages of every waveform
 * share their weights and have none of their own.
 */
interface Output {
  request: Request;
  /** Rows over ξ per pattern. */
  rows: Float64Array;
  /** Instants that count, for peaks. */
  instants: Instant[];
  /** Weight of each sample of each run, run after run; empty but for RMS values. */
  values: Float64Array;
  /** Weight of the slope at either end of each run. */
  slopes: Float64Array;
  /** Change of the reading per deviation of each start state. */
  ofStart: Float64Array;
}

/** What ψ itself, of the given value, does to the voltage beyond a rectifier's drop under pattern m. */
export type GapAnswer = (rectifier: number, m: number, psi: number) => number;

/** Readings prepared for many deviations of one cycle. */
export class Outputs {
  readonly runs: Run[];
  readonly outputs: Output[];

  constructor(
    readonly state: SteadyState,
    requests: readonly Request[],
  ) {
    this.runs = runsOf(state.trace);
    this.outputs = requests.map((request) => this.prepare(request));
  }

  get count(): number {
    return this.outputs.length;
  }

  /** Effect of a disturbance's ψ itself on every output under pattern m. */
  direct(disturbance: Disturbance, m: number): Float64Array {
    return Float64Array.from(this.outputs, ({ request }) =>
      'a' in request
        ? disturbance.nodes[request.a] - disturbance.nodes[request.b]
        : this.currentAnswer(request.element, disturbance, m),
    );
  }

  /**
   * Change of every output by one deviation, the start states' share left out.
   *
   * @param direct effect of ψ itself on every output, per pattern.
   */
  read(
    deviation: Deviation,
    direct: readonly (Float64Array | undefined)[],
    gapAnswer: GapAnswer = () => 0,
  ): Float64Array {
    const { width, states: n } = this.state.network.block;
    const averages = this.averages(deviation);
    return Float64Array.from(this.outputs, (output, o) => {
      const { rows } = output;
      let sum = 0;
      if (output.request.what === 'mean') {
        direct.forEach((answers, m) => {
          sum += dot(rows, m * width, averages, m * (n + 1), n);
          if (answers) sum += answers[o] * averages[m * (n + 1) + n];
        });
        return sum;
      }
      for (const { step, part, weight, corner } of output.instants) {
        const m = this.state.trace.which[step];
        const answer = direct[m]?.[o] ?? 0;
        if (corner) {
          const { gap } = this.state.network.met[m];
          const moved =
            dot(gap, corner.rectifier * width, deviation.d, (step + 1) * n, n) +
            gapAnswer(corner.rectifier, m, deviation.to[step]);
          sum -= (weight * corner.slope * moved) / corner.rate;
        }
        const from = dot(rows, m * width, deviation.d, step * n, n) + answer * deviation.from[step];
        const to =
          dot(rows, m * width, deviation.d, (step + 1) * n, n) + answer * deviation.to[step];
        sum += weight * ((1 - part) * from + part * to);
      }
      if (output.values.length === 0) return sum;
      let at = 0;
      this.runs.forEach((run, r) => {
        const row = run.which * width;
        const answer = direct[run.which]?.[o] ?? 0;
        for (let k = run.from; k <= run.to; k += 1, at += 1) {
          const psi = k < run.to ? deviation.from[k] : deviation.to[k - 1];
          sum += output.values[at] * (dot(rows, row, deviation.d, k * n, n) + answer * psi);
        }
        for (let end = 0; end < 2; end += 1) {
          const slope =
            dot(rows, row, deviation.rates, (2 * r + end) * n, n) +
            answer * deviation.psiRates[2 * r + end];
          sum += output.slopes[2 * r + end] * slope;
        }
      });
      return sum;
    });
  }

  /** Average of the deviation of the states and of ψ while each pattern held. */
  private averages(deviation: Deviation): Float64Array {
    const { network } = this.state;
    const { states: n, period } = network.block;
    const averages = new Float64Array(network.met.length * (n + 1));
    this.runs.forEach((run, r) => {
      const at = run.which * (n + 1);
      const whole = run.length / period;
      for (let k = run.from; k <= run.to; k += 1) {
        const weight = k === run.from || k === run.to ? whole / 2 : whole;
        for (let s = 0; s < n; s += 1) averages[at + s] += weight * deviation.d[k * n + s];
        const psi = k < run.to ? deviation.from[k] : deviation.to[k - 1];
        averages[at + n] += weight * psi;
      }
      const ends = (run.length * whole) / 12;
      for (let s = 0; s < n; s += 1) {
        averages[at + s] +=
          ends * (deviation.rates[2 * r * n + s] - deviation.rates[(2 * r + 1) * n + s]);
      }
      averages[at + n] += ends * (deviation.psiRates[2 * r] - deviation.psiRates[2 * r + 1]);
    });
    return averages;
  }

  private prepare(request: Request): Output {
    const { state } = this;
    const isPair = 'a' in request;
    const output: Output = {
      request,
      rows: isPair ? state.pairRows(request.a, request.b) : state.currentRows(request.element),
      instants: [],
      values: new Float64Array(0),
      slopes: new Float64Array(2 * this.runs.length),
      ofStart: new Float64Array(state.network.block.states),
    };
    if (request.what === 'peakToPeak') {
      const { highAt, lowAt } = state.extremes(request.a, request.b);
      output.instants.push(this.instant(output, highAt, 1), this.instant(output, lowAt, -1));
    } else if (request.what !== 'mean') {
      this.weigh(output);
    }
    return output;
  }

  private instant(output: Output, at: { sample: number; part: number }, weight: number): Instant {
    const { trace, network } = this.state;
    const { width, rectifiers } = network.block;
    // The end of one step rather than the start of the next: the pattern before a switching.
    const isStart = at.part === 0 && at.sample > 0;
    const step = isStart ? at.sample - 1 : at.sample;
    const part = isStart ? 1 : at.part;
    const m = trace.which[step];
    const change = network.met[m].pattern ^ network.met[trace.which[step + 1] ?? m].pattern;
    if (part < 1 || change === 0 || step + 2 >= trace.count) return { step, part, weight };
    const rectifier = rectifiers.findIndex((_, bit) => (change & (1 << bit)) !== 0);
    const end = (step + 1) * width;
    const row = output.rows.subarray(m * width, (m + 1) * width);
    const slope = dot(network.met[m].rateRow(row), 0, trace.xi, end, width);
    const rate = dot(network.met[m].gapRate, rectifier * width, trace.xi, end, width);
    return { step, part, weight, corner: rate === 0 ? undefined : { rectifier, slope, rate } };
  }

  /** Weights of an RMS value: the waveform itself over its RMS value, by the rule `gatherGram` uses. */
  private weigh(output: Output): void {
    const { state, runs } = this;
    const { trace, network } = state;
    const { width, period } = network.block;
    const { request, rows } = output;
    const moments =
      'a' in request ? state.pair(request.a, request.b) : state.current(request.element);
    const base = request.what === 'acRms' ? moments.mean : 0;
    const size = request.what === 'acRms' ? moments.acRms : moments.rms;
    const scale = size > 0 ? 1 / size : 0;
    output.values = new Float64Array(trace.count - 1 + runs.length);
    let at = 0;
    runs.forEach((run, r) => {
      const row = run.which * width;
      const rate = network.met[run.which].rateRow(rows.subarray(row, row + width));
      const whole = run.length / period;
      for (let k = run.from; k <= run.to; k += 1, at += 1) {
        const value = scale * (dot(rows, row, trace.xi, k * width, width) - base);
        const end = k === run.from ? 0 : k === run.to ? 1 : -1;
        output.values[at] = (end >= 0 ? whole / 2 : whole) * value;
        if (end < 0) continue;
        const ends = ((end === 0 ? 1 : -1) * run.length * whole) / 12;
        output.values[at] += ends * scale * dot(rate, 0, trace.xi, k * width, width);
        output.slopes[2 * r + end] = ends * value;
      }
    });
  }

  private currentAnswer(k: number, disturbance: Disturbance, m: number): number {
    const { network } = this.state;
    const { block } = network;
    const conduction = network.met[m];
    if (block.isIdeal[k]) {
      return conduction
        .termsOf(k)
        .reduce(
          (sum, { element, factor }) => sum + factor * this.currentAnswer(element, disturbance, m),
          0,
        );
    }
    const { a, b } = block.elements[k];
    const siemens = network.siemensOf(k, conduction.pattern);
    const own = disturbance.carriedBy === k ? 1 : 0;
    return siemens * (disturbance.nodes[a] - disturbance.nodes[b]) + own;
  }
}
