import type { Conduction } from './conduction';
import { cubicAt, cubicTurn, cubicZero, type Span } from './cubic';
import { dot } from './dense';
import type { Network } from './network';

/** How far a blocked rectifier may be above its drop, as a fraction of scale; switching is located to it. */
const AT_SWITCH = 1e-10;
/** How far the drop in a conducting one's own resistance may be below zero: just above rounding. */
const BACKWARDS = 1e-13;
/** Pulses a cubic says are this close to reaching conduction are looked at exactly. */
const NEAR_SWITCH = 1e-6;
/** After a switching into a stiff pattern the first step is up to 2^k times shorter. */
const FINEST = 11;
/** Steps a stretch under one pattern has at least. */
const SHORT_RUN = 4;
const MOST_LOCATIONS = 12;

/** One cycle as it was run: samples of ξ and the pattern that held between them. */
export interface Trace {
  /** Number of samples. */
  count: number;
  time: Float64Array;
  /** Seconds from each sample to the next. */
  length: Float64Array;
  /** ξ of each sample, width numbers each. */
  xi: Float64Array;
  /** Index in `network.met` of the pattern from each sample to the next. */
  which: Int32Array;
}

/**
 * Runs a block through one cycle. Between two switchings the block is linear and is solved exactly;
 * a switching instant is located to `AT_SWITCH` of the largest voltage. The steps only decide where
 * rectifiers are looked at and where the waveform is sampled.
 */
export class CycleRunner {
  readonly trace: Trace;
  /** True when the rectifiers chattered and switching was no longer followed exactly. */
  isRough = false;
  private readonly x: Float64Array;
  private readonly trial: Float64Array;
  private readonly probe: Float64Array;
  private readonly start: Float64Array;
  private readonly gaps: Float64Array;
  private readonly rates: Float64Array;
  private readonly nextGaps: Float64Array;
  private readonly nextRates: Float64Array;
  private pattern = 0;

  constructor(private readonly network: Network) {
    const { width, states, rectifiers } = network.block;
    const room = 128;
    this.trace = {
      count: 0,
      time: new Float64Array(room),
      length: new Float64Array(room),
      xi: new Float64Array(room * width),
      which: new Int32Array(room),
    };
    this.x = new Float64Array(states);
    this.trial = new Float64Array(width);
    this.probe = new Float64Array(width);
    this.start = new Float64Array(width);
    this.gaps = new Float64Array(rectifiers.length);
    this.rates = new Float64Array(rectifiers.length);
    this.nextGaps = new Float64Array(rectifiers.length);
    this.nextRates = new Float64Array(rectifiers.length);
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
    const { network, trace, start, trial } = this;
    const { block, clock } = network;
    const { step } = clock;
    const { states, period, rectifiers } = block;
    this.isRough = false;
    let switchings = 0;
    const mostSwitchings = 60 + 20 * rectifiers.length;
    start.set(x0);
    this.clock(start, 0);
    trace.count = 0;
    let time = 0;
    let finer = 1;
    let since = 0;
    let isShort = false;
    let at = this.settle(start);
    this.look(network.met[at], start, this.gaps, this.rates);
    this.record(time, start);
    while (time < period) {
      const conduction = network.met[at];
      let length = Math.min(step / finer, period - time);
      this.move(conduction, start, length, time, trial);
      this.look(conduction, trial, this.nextGaps, this.nextRates);
      let flips = -1;
      if (switchings < mostSwitchings) {
        const event = this.firstSwitching(conduction, start, length, time);
        if (event && !isShort && since < SHORT_RUN && event.length > 1e-6 * step) {
          // A pulse shorter than a few steps: sample it finely, or averages miss its shape.
          finer = (SHORT_RUN + 0.5) * (step / event.length);
          isShort = true;
          continue;
        }
        if (event) {
          flips = event.rectifier;
          length = event.length;
          switchings += 1;
        }
      } else {
        this.isRough = true;
      }
      const isLast = time + length >= period * (1 - 1e-13);
      time = isLast ? period : time + length;
      if (length > 0) {
        trace.which[trace.count - 1] = at;
        trace.length[trace.count - 1] = length;
        this.record(time, trial);
      }
      start.set(trial);
      if (flips >= 0 || this.isRough) {
        if (flips >= 0) this.pattern = conduction.pattern ^ (1 << flips);
        at = this.settle(start);
        this.look(network.met[at], start, this.gaps, this.rates);
        // What is faster than a step shows right after a switching: begin finely and double.
        const { halvings } = network.met[at].propagator;
        finer = 2 ** Math.min(halvings, FINEST);
        since = 0;
        isShort = false;
      } else {
        this.gaps.set(this.nextGaps);
        this.rates.set(this.nextRates);
        // Two steps of the shortest length, then doubling: together one whole step.
        if (finer > 1 && !isShort && since > 0) finer = Math.max(1, finer / 2);
        since += 1;
      }
    }
    trace.which[trace.count - 1] = at;
    if (monodromy) this.differentiate(monodromy);
    this.x.set(trial.subarray(0, states));
    return trace;
  }

  /** States at the end of the last run. */
  get end(): Float64Array {
    return this.x;
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

  private clock(xi: Float64Array, time: number): void {
    const { states, omega } = this.network.block;
    xi[states] = Math.sin(omega * time);
    xi[states + 1] = Math.cos(omega * time);
    xi[states + 2] = 1;
  }

  private move(
    conduction: Conduction,
    from: Float64Array,
    length: number,
    time: number,
    to: Float64Array,
  ): void {
    const { states } = this.network.block;
    const { x } = this;
    for (let i = 0; i < states; i += 1) x[i] = from[i];
    conduction.propagator.advance(x, length, from[states], from[states + 1]);
    for (let i = 0; i < states; i += 1) to[i] = x[i];
    this.clock(to, time + length);
  }

  private look(
    conduction: Conduction,
    xi: Float64Array,
    gaps: Float64Array,
    rates: Float64Array,
  ): void {
    const { width } = this.network.block;
    for (let i = 0; i < gaps.length; i += 1) {
      gaps[i] = dot(conduction.gap, i * width, xi, 0, width);
      rates[i] = dot(conduction.gapRate, i * width, xi, 0, width);
    }
  }

  private record(time: number, xi: Float64Array): void {
    const { trace } = this;
    const { width } = this.network.block;
    if (trace.count === trace.time.length) {
      trace.time = grown(trace.time);
      trace.length = grown(trace.length);
      trace.xi = grown(trace.xi);
      const which = new Int32Array(trace.which.length * 2);
      which.set(trace.which);
      trace.which = which;
    }
    trace.time[trace.count] = time;
    trace.xi.set(xi.subarray(0, width), trace.count * width);
    trace.count += 1;
  }

  /**
   * Pattern in which no rectifier conducts backwards or blocks beyond its drop, for given states: a
   * linear complementarity problem. All offenders are switched at once; should that go round in
   * circles, the first one alone (K. Murty, Opsearch 11 (1974) 123-135), which always ends.
   *
   * @returns index in `network.met`.
   */
  private settle(xi: Float64Array): number {
    const { network } = this;
    const { rectifiers, width, scale } = network.block;
    let at = network.indexOf(this.pattern);
    for (let round = 0; round < 8 + 4 * 2 ** Math.min(rectifiers.length, 8); round += 1) {
      const conduction = network.met[at];
      let offenders = 0;
      for (let i = 0; i < rectifiers.length; i += 1) {
        const gap = dot(conduction.gap, i * width, xi, 0, width);
        const isOn = (conduction.pattern & (1 << i)) !== 0;
        if (isOn ? gap >= -BACKWARDS * scale : gap <= AT_SWITCH * scale) continue;
        offenders |= 1 << i;
        if (round >= 6) break;
      }
      if (offenders === 0) break;
      this.pattern = conduction.pattern ^ offenders;
      at = network.indexOf(this.pattern);
    }
    return at;
  }

  /**
   * The first switching within a step, with `trial` moved to that instant; nothing when no rectifier
   * switches.
   */
  private firstSwitching(
    conduction: Conduction,
    start: Float64Array,
    length: number,
    time: number,
  ): { rectifier: number; length: number } | undefined {
    const { gaps, rates, nextGaps, nextRates, network, trial } = this;
    const { rectifiers, scale } = network.block;
    let found: { rectifier: number; length: number } | undefined;
    let reach = length;
    for (let tries = 0; tries <= rectifiers.length; tries += 1) {
      let earliest: { rectifier: number; span: Span; guess: number } | undefined;
      for (let i = 0; i < rectifiers.length; i += 1) {
        if (found?.rectifier === i) continue;
        const isOn = (conduction.pattern & (1 << i)) !== 0;
        const sign = isOn ? -1 : 1;
        const tolerance = (isOn ? BACKWARDS : AT_SWITCH) * scale;
        const span: Span = {
          length: reach,
          from: sign * gaps[i],
          fromSlope: sign * rates[i],
          to: sign * nextGaps[i],
          toSlope: sign * nextRates[i],
        };
        if (span.to <= tolerance && !this.peaksInside(conduction, start, time, i, sign, span))
          continue;
        if (span.from > 0) {
          if (span.fromSlope >= 0) {
            trial.set(start);
            return { rectifier: i, length: 0 };
          }
          span.from = 0;
        }
        span.from -= tolerance;
        const guess = cubicZero(span) * span.length;
        if (!earliest || guess < earliest.guess) earliest = { rectifier: i, span, guess };
      }
      if (!earliest) break;
      reach = this.locate(
        conduction,
        start,
        time,
        earliest.rectifier,
        earliest.span,
        earliest.guess,
      );
      found = { rectifier: earliest.rectifier, length: reach };
      // Another rectifier may have switched before this instant.
      this.look(conduction, trial, nextGaps, nextRates);
    }
    return found;
  }

  /** True when a quantity that is below zero at both ends of a span rises above it in between. */
  private peaksInside(
    conduction: Conduction,
    start: Float64Array,
    time: number,
    i: number,
    sign: number,
    span: Span,
  ): boolean {
    if (!(span.fromSlope > 0 && span.toSlope < 0)) return false;
    const { block } = this.network;
    const turn = cubicTurn(span);
    if (cubicAt(span, turn) < -NEAR_SWITCH * block.scale) return false;
    const length = turn * span.length;
    this.move(conduction, start, length, time, this.probe);
    const value = sign * dot(conduction.gap, i * block.width, this.probe, 0, block.width);
    if (value <= AT_SWITCH * block.scale) return false;
    span.length = length;
    span.to = value;
    span.toSlope = sign * dot(conduction.gapRate, i * block.width, this.probe, 0, block.width);
    return true;
  }

  /**
   * Instant at which a rectifier's quantity has just passed zero, so that its new state is the right
   * one; leaves `trial` there.
   */
  private locate(
    conduction: Conduction,
    start: Float64Array,
    time: number,
    i: number,
    span: Span,
    guess: number,
  ): number {
    const { trial, network } = this;
    const { width, scale } = network.block;
    const isOn = (conduction.pattern & (1 << i)) !== 0;
    const sign = isOn ? -1 : 1;
    const beyond = (isOn ? 0.5 * BACKWARDS : 0.05 * AT_SWITCH) * scale;
    let low = 0;
    let part = { ...span };
    let at = guess;
    for (let round = 0; round < MOST_LOCATIONS; round += 1) {
      this.move(conduction, start, at, time, trial);
      const value = sign * dot(conduction.gap, i * width, trial, 0, width) - beyond;
      if (Math.abs(value) < beyond) break;
      const slope = sign * dot(conduction.gapRate, i * width, trial, 0, width);
      if (value > 0) {
        part = { ...part, length: at - low, to: value, toSlope: slope };
      } else {
        part = { ...part, length: low + part.length - at, from: value, fromSlope: slope };
        low = at;
      }
      const next = low + cubicZero(part) * part.length;
      if (next === at) break;
      at = next;
    }
    return at;
  }
}

function grown(array: Float64Array): Float64Array<ArrayBuffer> {
  const larger = new Float64Array(array.length * 2);
  larger.set(array);
  return larger;
}
