import type { Propagator } from './propagator';

/** Powers of time a drive is made of: a cubic. */
const POWERS = 4;
/** Terms of a series over a length with a norm below 1/4. */
const SERIES = 8;
const FACTORIAL = [1, 1, 2, 6, 24, 120, 720, 5040, 40320];
const BINOMIAL = [[1], [1, 1], [1, 2, 1], [1, 3, 3, 1]];

/**
 * Steps of a deviation d' = A·d + rates·J(t), J a cubic within the step. The answers to 1, t, t² and
 * t³ are doubled from the propagator's shortest level up, so that they are exact beside fast time
 * constants too.
 */
export class ForcedSteps {
  /** Level after level: the answers to the four powers over that level's length. */
  private readonly answers: Float64Array;
  private readonly c = new Float64Array(POWERS);
  private readonly term: Float64Array;
  private readonly next: Float64Array;

  /** @param rates effect of J on the rate of each state. */
  constructor(
    private readonly propagator: Propagator,
    private readonly rates: Float64Array,
  ) {
    const { n, halvings } = propagator;
    this.answers = new Float64Array((halvings + 1) * POWERS * n);
    this.term = new Float64Array(n);
    this.next = new Float64Array(n);
    this.shortest();
    for (let level = halvings; level > 0; level -= 1) this.double(level);
  }

  /**
   * Moves a deviation on in place.
   *
   * @param from J at the start of the step, `fromSlope` its rate there.
   * @param to J at its end, `toSlope` its rate there.
   */
  advance(
    d: Float64Array,
    length: number,
    from: number,
    fromSlope: number,
    to: number,
    toSlope: number,
  ): void {
    const { c } = this;
    const { halvings, clock } = this.propagator;
    const chord = (to - from) / length;
    c[0] = from;
    c[1] = fromSlope;
    c[2] = (3 * chord - 2 * fromSlope - toSlope) / length;
    c[3] = (fromSlope + toSlope - 2 * chord) / (length * length);
    if (length === clock.step) {
      this.apply(0, d);
      return;
    }
    let left = length;
    for (let level = 1; level <= halvings; level += 1) {
      const part = clock.length[level];
      if (left < part) continue;
      this.apply(level, d);
      // The cubic seen from the new origin.
      c[0] += part * (c[1] + part * (c[2] + part * c[3]));
      c[1] += part * (2 * c[2] + 3 * part * c[3]);
      c[2] += 3 * part * c[3];
      left -= part;
    }
    this.rest(d, left);
  }

  private apply(level: number, d: Float64Array): void {
    const { c, answers } = this;
    const { n } = this.propagator;
    this.propagator.carryLevel(d, 0, level);
    let at = level * POWERS * n;
    for (let k = 0; k < POWERS; k += 1) {
      for (let i = 0; i < n; i += 1, at += 1) d[i] += c[k] * answers[at];
    }
  }

  /** Taylor series over what is left below the shortest level. */
  private rest(d: Float64Array, length: number): void {
    if (length <= 0) return;
    const { n, a } = this.propagator;
    const { c } = this;
    let term = this.term;
    let next = this.next;
    term.set(d);
    let power = 1;
    for (let k = 1; k <= SERIES; k += 1) {
      const drive = k <= POWERS ? c[k - 1] * power : 0;
      power *= length;
      let largest = 0;
      for (let i = 0, p = 0; i < n; i += 1) {
        let sum = drive * this.rates[i];
        for (let j = 0; j < n; j += 1, p += 1) sum += a[p] * term[j];
        next[i] = (sum * length) / k;
        d[i] += next[i];
        largest = Math.max(largest, Math.abs(next[i]) - 1e-15 * Math.abs(d[i]));
      }
      if (largest <= 0 && k >= POWERS) return;
      [term, next] = [next, term];
    }
  }

  /** Answers over the shortest level, by their series: A^m·rates·k!/(k+m+1)!·t^(k+m+1). */
  private shortest(): void {
    const { answers } = this;
    const { n, a, halvings, clock } = this.propagator;
    const t = clock.length[halvings];
    const base = halvings * POWERS * n;
    let term = this.rates.slice();
    let next = new Float64Array(n);
    for (let m = 0; m < SERIES; m += 1) {
      let factor = t ** (m + 1) / FACTORIAL[m + 1];
      for (let k = 0; k < POWERS; k += 1) {
        for (let i = 0; i < n; i += 1) answers[base + k * n + i] += factor * term[i];
        factor *= (t * (k + 1)) / (k + m + 2);
      }
      for (let i = 0; i < n; i += 1) {
        let sum = 0;
        for (let j = 0; j < n; j += 1) sum += a[i * n + j] * term[j];
        next[i] = sum;
      }
      [term, next] = [next, term];
    }
  }

  /** Answers over twice a level's length: p_k(2t) = e^{At}·p_k(t) + Σ_j C(k, j)·t^(k−j)·p_j(t). */
  private double(level: number): void {
    const { answers, propagator } = this;
    const { n, clock } = propagator;
    const t = clock.length[level];
    const from = level * POWERS * n;
    const to = from - POWERS * n;
    for (let k = 0; k < POWERS; k += 1) {
      const target = to + k * n;
      for (let i = 0; i < n; i += 1) answers[target + i] = answers[from + k * n + i];
      propagator.carryLevel(answers, target, level);
      for (let j = 0; j <= k; j += 1) {
        const factor = BINOMIAL[k][j] * t ** (k - j);
        for (let i = 0; i < n; i += 1) answers[target + i] += factor * answers[from + j * n + i];
      }
    }
  }
}
