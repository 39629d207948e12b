import type { Network } from './network';
import { SwitchingFinder } from './switching';
import { newTrace, record, type Trace } from './trace';

/** After a switching into a stiff pattern the first step is up to 2^k times shorter. */
const FINEST = 11;
/** Steps a stretch under one pattern has at least. */
const SHORT_RUN = 4;

/**
 * Runs a block through one cycle. Between two switchings the block is linear and is solved exactly;
 * switching instants are located to 1e-10 of the largest voltage. The steps only decide where
 * rectifiers are looked at and where the waveform is sampled.
 */
export class CycleRunner {
  readonly trace: Trace;
  /** True when the rectifiers chattered and switching was no longer followed exactly. */
  isRough = false;
  /** States at the end of the last run. */
  readonly end: Float64Array;
  private readonly finder: SwitchingFinder;
  private readonly start: Float64Array;
  private pattern = 0;

  constructor(private readonly network: Network) {
    const { width, states } = network.block;
    this.trace = newTrace(width, 128);
    this.finder = new SwitchingFinder(network);
    this.end = new Float64Array(states);
    this.start = new Float64Array(width);
  }

  /**
   * Runs one cycle from a state.
   *
   * @param x0 states at the start of the cycle.
   * @param monodromy when given, receives the derivative of the end state by the start state,
   *   states×states, one column after the other. Currents and voltages have no jump where a
   *   rectifier switches, so the instant itself adds nothing to the derivative.
   * @returns the trace, which the next run overwrites.
   */
  run(x0: Float64Array, monodromy?: Float64Array): Trace {
    const { network, trace, start, finder } = this;
    const { trial } = finder;
    const { block, clock } = network;
    const { step } = clock;
    const { states, width, period, rectifiers } = block;
    this.isRough = false;
    let switchings = 0;
    const mostSwitchings = 60 + 20 * rectifiers.length;
    start.set(x0);
    finder.clock(start, 0);
    trace.count = 0;
    let time = 0;
    let finer = 1;
    let since = 0;
    let isShort = false;
    let at = finder.settle(start, this.pattern);
    finder.begin(network.met[at], start);
    record(trace, width, time, start);
    while (time < period) {
      const conduction = network.met[at];
      let length = Math.min(step / finer, period - time);
      this.isRough ||= switchings >= mostSwitchings;
      const event = finder.attempt(conduction, start, length, time, !this.isRough);
      let flips = -1;
      if (event) {
        if (!isShort && since < SHORT_RUN && event.length > 1e-6 * step) {
          // A pulse shorter than a few steps: sample it finely, or averages miss its shape.
          finer = (SHORT_RUN + 0.5) * (step / event.length);
          isShort = true;
          continue;
        }
        flips = event.rectifier;
        length = event.length;
        switchings += 1;
      }
      const isLast = time + length >= period * (1 - 1e-13);
      time = isLast ? period : time + length;
      if (length > 0) {
        trace.which[trace.count - 1] = at;
        trace.length[trace.count - 1] = length;
        record(trace, width, time, trial);
      }
      start.set(trial);
      if (flips >= 0 || this.isRough) {
        at = finder.settle(start, conduction.pattern ^ (flips >= 0 ? 1 << flips : 0));
        finder.begin(network.met[at], start);
        // What is faster than a step shows right after a switching: begin finely and double.
        const { halvings } = network.met[at].propagator;
        finer = 2 ** Math.min(halvings, FINEST);
        since = 0;
        isShort = false;
      } else {
        finder.accept();
        // Two steps of the shortest length, then doubling: together one whole step.
        if (finer > 1 && !isShort && since > 0) finer = Math.max(1, finer / 2);
        since += 1;
      }
    }
    trace.which[trace.count - 1] = at;
    if (monodromy) this.differentiate(monodromy);
    this.pattern = network.met[at].pattern;
    this.end.set(trial.subarray(0, states));
    return trace;
  }

  private differentiate(monodromy: Float64Array): void {
    const { trace, network } = this;
    const { states } = network.block;
    monodromy.fill(0);
    for (let i = 0; i < states; i += 1) monodromy[i * states + i] = 1;
    for (let k = 0; k + 1 < trace.count;) {
      const which = trace.which[k];
      const from = trace.time[k];
      while (k + 1 < trace.count && trace.which[k] === which) k += 1;
      network.met[which].propagator.carryAll(monodromy, trace.time[k] - from);
    }
  }

  /**
   * Adds to every sample what a deviation of the start state does to it while all switching
   * instants stay; with the Newton step as deviation the samples become those of the periodic state
   * up to the square of that step.
   */
  correct(deviation: Float64Array): void {
    const { trace, network } = this;
    const { states, width } = network.block;
    const d = deviation.slice();
    for (let k = 0; k < trace.count; k += 1) {
      for (let i = 0; i < states; i += 1) trace.xi[k * width + i] += d[i];
      if (k + 1 === trace.count) break;
      network.met[trace.which[k]].propagator.carry(d, 0, trace.length[k]);
    }
  }
}
