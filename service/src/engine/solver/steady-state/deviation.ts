import type { Conduction } from './conduction';
import { dot, solveDense } from './dense';
import { type Disturbance, disturbanceOf, type Field } from './disturbance';
import { ForcedSteps } from './forced-steps';
import type { GapAnswer, Outputs } from './outputs';
import type { SteadyState } from './steady-state';

/** How the states and ψ deviate through one cycle. */
export interface Deviation {
  /** Deviation of the states at every sample. */
  d: Float64Array;
  /** ψ at the start and at the end of every step, by the row of that step's pattern. */
  from: Float64Array;
  to: Float64Array;
  /** Rates of the states' deviation and of ψ at either end of every run. */
  rates: Float64Array;
  psiRates: Float64Array;
}

/** Runs deviations through a solved cycle and reads the outputs off them. */
export class DeviationField {
  private readonly impedances: Float64Array[];
  /** Inverse of 1 − derivative of the end states by the start states. */
  private readonly closing: Float64Array;
  private readonly deviation: Deviation;

  constructor(
    private readonly state: SteadyState,
    private readonly outputs: Outputs,
  ) {
    const { network, trace } = state;
    const n = network.block.states;
    this.impedances = network.met.map(({ pattern }) => network.impedances(pattern));
    this.deviation = {
      d: new Float64Array(trace.count * n),
      from: new Float64Array(trace.count),
      to: new Float64Array(trace.count),
      rates: new Float64Array(2 * outputs.runs.length * n),
      psiRates: new Float64Array(2 * outputs.runs.length),
    };
    const nothing = network.met.map(() => undefined);
    // Newton's monodromy is a little rough beside fast modes; a nearly unloaded supply needs better.
    const matrix = new Float64Array(n * n);
    this.closing = new Float64Array(n * n);
    for (let s = 0; s < n; s += 1) {
      this.deviation.d.fill(0, 0, n);
      this.deviation.d[s] = 1;
      this.run(nothing);
      this.closing[s * n + s] = 1;
      for (let i = 0; i < n; i += 1) {
        matrix[i * n + s] = (i === s ? 1 : 0) - this.deviation.d[(trace.count - 1) * n + i];
      }
      outputs.read(this.deviation, nothing).forEach((value, o) => {
        outputs.outputs[o].ofStart[s] = value;
      });
    }
    solveDense(matrix, this.closing, n, n);
  }

  /** Change of every output per relative change of one figure, the cycle staying periodic. */
  column(k: number, name: Field): Float64Array {
    const { state, outputs, closing, deviation } = this;
    const { network, trace } = state;
    const n = network.block.states;
    const disturbances = network.met.map((conduction, m) =>
      disturbanceOf(network, conduction, this.impedances[m], k, name),
    );
    const direct = disturbances.map(
      (disturbance, m) => disturbance && outputs.direct(disturbance, m),
    );
    deviation.d.fill(0, 0, n);
    this.run(disturbances);
    const start = new Float64Array(n);
    for (let i = 0; i < n; i += 1)
      start[i] = dot(closing, i * n, deviation.d, (trace.count - 1) * n, n);
    const gapAnswer: GapAnswer = (rectifier, m, psi) => {
      const element = network.block.elements[network.block.rectifiers[rectifier]];
      const nodes = disturbances[m]?.nodes;
      const moved = nodes ? psi * (nodes[element.a] - nodes[element.b]) : 0;
      const isDrop = name === 'dropVolts' && network.block.rectifiers[rectifier] === k;
      return isDrop && element.kind === 'rectifier' ? moved - element.dropVolts : moved;
    };
    return outputs
      .read(deviation, direct, gapAnswer)
      .map((value, o) => value + dot(outputs.outputs[o].ofStart, 0, start, 0, n));
  }

  /** Carries a deviation, whose start is in place, through the cycle. */
  private run(disturbances: readonly (Disturbance | undefined)[]): void {
    const { network, trace } = this.state;
    const { width, states: n } = network.block;
    const { d, from, to } = this.deviation;
    const forced = disturbances.map((disturbance, m) => {
      const { propagator } = network.met[m];
      return disturbance && new ForcedSteps(propagator, disturbance.rates);
    });
    const rows = disturbances.map(
      (disturbance, m) => disturbance && network.met[m].rateRow(disturbance.psi),
    );
    const now = d.slice(0, n);
    this.outputs.runs.forEach((run, r) => {
      const disturbance = disturbances[run.which];
      const conduction = network.met[run.which];
      this.slopes(conduction, disturbance, rows[run.which], run.from, 2 * r);
      for (let k = run.from; k < run.to; k += 1) {
        const steps = forced[run.which];
        if (disturbance && steps) {
          const rate = rows[run.which]!;
          from[k] = dot(disturbance.psi, 0, trace.xi, k * width, width);
          to[k] = dot(disturbance.psi, 0, trace.xi, (k + 1) * width, width);
          const fromSlope = dot(rate, 0, trace.xi, k * width, width);
          const toSlope = dot(rate, 0, trace.xi, (k + 1) * width, width);
          steps.advance(now, run.length, from[k], fromSlope, to[k], toSlope);
        } else {
          from[k] = 0;
          to[k] = 0;
          conduction.propagator.carry(now, 0, run.length);
        }
        d.set(now, (k + 1) * n);
      }
      this.slopes(conduction, disturbance, rows[run.which], run.to, 2 * r + 1);
    });
  }

  private slopes(
    conduction: Conduction,
    disturbance: Disturbance | undefined,
    rate: Float64Array | undefined,
    sample: number,
    at: number,
  ): void {
    const { network, trace } = this.state;
    const { width, states: n } = network.block;
    const { d, rates, psiRates } = this.deviation;
    const psi = disturbance ? dot(disturbance.psi, 0, trace.xi, sample * width, width) : 0;
    psiRates[at] = rate ? dot(rate, 0, trace.xi, sample * width, width) : 0;
    for (let i = 0; i < n; i += 1) {
      rates[at * n + i] =
        dot(conduction.a, i * n, d, sample * n, n) + (disturbance ? disturbance.rates[i] * psi : 0);
    }
  }
}
