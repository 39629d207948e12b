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
const MOST_LOCATIONS = 12;

/** A rectifier that begins or ends to conduct, so many seconds into a step. */
export interface Switching {
  rectifier: number;
  length: number;
}

/** Steps a block forward under one pattern and finds the instants at which rectifiers switch. */
export class SwitchingFinder {
  /** ξ at the end of the step tried, or at the switching found in it. */
  readonly trial: Float64Array;
  private readonly probe: Float64Array;
  private readonly x: Float64Array;
  private readonly gaps: Float64Array;
  private readonly rates: Float64Array;
  private readonly nextGaps: Float64Array;
  private readonly nextRates: Float64Array;

  constructor(private readonly network: Network) {
    const { width, states, rectifiers } = network.block;
    this.trial = new Float64Array(width);
    this.probe = new Float64Array(width);
    this.x = new Float64Array(states);
    this.gaps = new Float64Array(rectifiers.length);
    this.rates = new Float64Array(rectifiers.length);
    this.nextGaps = new Float64Array(rectifiers.length);
    this.nextRates = new Float64Array(rectifiers.length);
  }

  /** Looks at the rectifiers where a stretch under one pattern begins. */
  begin(conduction: Conduction, start: Float64Array): void {
    this.look(conduction, start, this.gaps, this.rates);
  }

  /**
   * Tries one step from `start`.
   *
   * @param isLocated false takes the whole step whatever the rectifiers do in it.
   * @returns the first switching within it, with `trial` moved to that instant; nothing when no
   *   rectifier switches and `trial` is the end of the step.
   */
  attempt(
    conduction: Conduction,
    start: Float64Array,
    length: number,
    time: number,
    isLocated: boolean,
  ): Switching | undefined {
    this.move(conduction, start, length, time, this.trial);
    this.look(conduction, this.trial, this.nextGaps, this.nextRates);
    if (!isLocated) return undefined;
    return this.firstSwitching(conduction, start, length, time);
  }

  /** Takes the step tried last: its end is the start of the next. */
  accept(): void {
    this.gaps.set(this.nextGaps);
    this.rates.set(this.nextRates);
  }

  /** Writes the drive at an instant into ξ. */
  clock(xi: Float64Array, time: number): void {
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

  /**
   * Pattern in which no rectifier conducts backwards or blocks beyond its drop, for given states: a
   * linear complementarity problem. All offenders are switched at once; should that go round in
   * circles, the first one alone (K. Murty, Opsearch 11 (1974) 123-135), which always ends.
   *
   * @param from pattern to begin with.
   * @returns index in `network.met`.
   */
  settle(xi: Float64Array, from: number): number {
    const { network } = this;
    const { rectifiers, width, scale } = network.block;
    let at = network.indexOf(from);
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
      at = network.indexOf(conduction.pattern ^ offenders);
    }
    return at;
  }

  private firstSwitching(
    conduction: Conduction,
    start: Float64Array,
    length: number,
    time: number,
  ): Switching | undefined {
    const { gaps, rates, nextGaps, nextRates, network, trial } = this;
    const { rectifiers, scale } = network.block;
    let found: Switching | undefined;
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
