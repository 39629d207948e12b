import type { Propagator } from './propagator';

/**
 * Steps of a deviation d' = A·d + rates·J(t) for a J that is linear within the step. The answers to
 * a constant and to a ramp are doubled from the propagator's shortest level up, so that they are
 * exact beside fast time constants too.
 */
export class ForcedSteps {
  /** Level after level: answer to J = 1, and to J = t, over that level's length. */
  private readonly constant: Float64Array;
  private readonly ramp: Float64Array;

  /** @param rates effect of J on the rate of each state. */
  constructor(
    private readonly propagator: Propagator,
    private readonly rates: Float64Array,
  ) {
    const { n, halvings, clock } = propagator;
    this.constant = new Float64Array((halvings + 1) * n);
    this.ramp = new Float64Array((halvings + 1) * n);
    this.shortest(halvings * n, clock.length[halvings]);
    for (let level = halvings; level > 0; level -= 1) {
      const from = level * n;
      const to = from - n;
      const length = clock.length[level];
      for (let i = 0; i < n; i += 1) {
        this.constant[to + i] = this.constant[from + i];
        this.ramp[to + i] = this.ramp[from + i];
      }
      propagator.carryLevel(this.constant, to, level);
      propagator.carryLevel(this.ramp, to, level);
      for (let i = 0; i < n; i += 1) {
        this.constant[to + i] += this.constant[from + i];
        this.ramp[to + i] += this.ramp[from + i] + length * this.constant[from + i];
      }
    }
  }

  /**
   * Moves a deviation on in place.
   *
   * @param from J at the start of the step.
   * @param to J at its end.
   */
  advance(d: Float64Array, length: number, from: number, to: number): void {
    const { propagator } = this;
    const { halvings, clock } = propagator;
    const slope = (to - from) / length;
    if (length === clock.step) {
      this.apply(0, d, from, slope);
      return;
    }
    let left = length;
    let value = from;
    for (let level = 1; level <= halvings; level += 1) {
      const part = clock.length[level];
      if (left < part) continue;
      this.apply(level, d, value, slope);
      value += slope * part;
      left -= part;
    }
    this.rest(d, left, value, slope);
  }

  private apply(level: number, d: Float64Array, value: number, slope: number): void {
    const { n } = this.propagator;
    this.propagator.carryLevel(d, 0, level);
    const at = level * n;
    for (let i = 0; i < n; i += 1) {
      d[i] += value * this.constant[at + i] + slope * this.ramp[at + i];
    }
  }

  /** Taylor series of fourth order over what is left below the shortest level. */
  private rest(d: Float64Array, length: number, value: number, slope: number): void {
    if (length <= 0) return;
    const { n, a } = this.propagator;
    let term = d.slice();
    for (let k = 1; k <= 4; k += 1) {
      const drive = k === 1 ? value : k === 2 ? slope * length : 0;
      const next = new Float64Array(n);
      for (let i = 0; i < n; i += 1) {
        let sum = drive * this.rates[i];
        for (let j = 0; j < n; j += 1) sum += a[i * n + j] * term[j];
        next[i] = (sum * length) / k;
        d[i] += next[i];
      }
      term = next;
    }
  }

  /** Both answers over the shortest level, by their series. */
  private shortest(at: number, t: number): void {
    const { n, a } = this.propagator;
    let term = this.rates.map((rate) => rate * t);
    for (let k = 1; k <= 10; k += 1) {
      // term = A^(k−1)·rates·t^k/k!; the ramp's answer is its integral, t·term/(k + 1).
      const next = new Float64Array(n);
      for (let i = 0; i < n; i += 1) {
        this.constant[at + i] += term[i];
        this.ramp[at + i] += (term[i] * t) / (k + 1);
        for (let j = 0; j < n; j += 1) next[i] += (a[i * n + j] * term[j] * t) / (k + 1);
      }
      term = next;
    }
  }
}
