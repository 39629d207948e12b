import type { Conduction } from './conduction';
import { dot, solveDense } from './dense';
import { type Disturbance, disturbanceOf, type Field } from './disturbance';
import { ForcedSteps } from './forced-steps';
import type { Outputs } from './outputs';
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
  /** Inverse of 1 − monodromy. */
  private readonly closing: Float64Array;
  private readonly deviation: Deviation;

  constructor(
    private readonly state: SteadyState,
    private readonly outputs: Outputs,
  ) {
    const { network, monodromy, trace } = state;
    const n = network.block.states;
    this.impedances = network.met.map(({ pattern }) => network.impedances(pattern));
    const matrix = new Float64Array(n * n);
    this.closing = new Float64Array(n * n);
    for (let i = 0; i < n; i += 1) {
      this.closing[i * n + i] = 1;
      for (let j = 0; j < n; j += 1) matrix[i * n + j] = (i === j ? 1 : 0) - monodromy[j * n + i];
    }
    solveDense(matrix, this.closing, n, n);
    this.deviation = {
      d: new Float64Array(trace.count * n),
      from: new Float64Array(trace.count),
      to: new Float64Array(trace.count),
      rates: new Float64Array(2 * outputs.runs.length * n),
      psiRates: new Float64Array(2 * outputs.runs.length),
    };
    const nothing = network.met.map(() => undefined);
    for (let s = 0; s < n; s += 1) {
      this.deviation.d.fill(0, 0, n);
      this.deviation.d[s] = 1;
      this.run(nothing);
      outputs.read(this.deviation, nothing).forEach((value, o) => {
        outputs.outputs[o].ofStart[s] = value;
      });
    }
  }

  /** Change of every output per relative change of one figure, the cycle staying periodic. */
  column(k: number, name: Field): Float64Array {
    const { state, outputs, closing, deviation } = this;
    const { network, trace } = state;
    const n = network.block.states;
    const disturbances = network.met.map((conduction, m) =>
      disturbanceOf(network, conduction, this.impedances[m], k, name),
    );
    const direct = disturbances.map((disturbance, m) => disturbance && outputs.direct(disturbance, m));
    deviation.d.fill(0, 0, n);
    this.run(disturbances);
    const start = new Float64Array(n);
    for (let i = 0; i < n; i += 1) start[i] = dot(closing, i * n, deviation.d, (trace.count - 1) * n, n);
    return outputs
      .read(deviation, direct)
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
          // A straight line with the area of the cubic through both ends and slopes.
          const lift =
            (run.length / 12) *
            (dot(rate, 0, trace.xi, k * width, width) -
              dot(rate, 0, trace.xi, (k + 1) * width, width));
          steps.advance(now, run.length, from[k] + lift, to[k] + lift);
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
