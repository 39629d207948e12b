/** Terms of the Taylor series; with a norm below 1/4 the rest is under 1e-14. */
const TERMS = 10;
const SMALL_NORM = 0.25;
const MOST_HALVINGS = 60;

/** Halves, quarters … of a step and how far the drive turns in each; shared by all propagators. */
export class StepClock {
  readonly length = new Float64Array(MOST_HALVINGS + 1);
  readonly sin = new Float64Array(MOST_HALVINGS + 1);
  readonly cos = new Float64Array(MOST_HALVINGS + 1);

  /**
   * @param omega angular frequency of the drive.
   * @param step longest length of time in seconds.
   */
  constructor(
    readonly omega: number,
    readonly step: number,
  ) {
    for (let level = 0; level <= MOST_HALVINGS; level += 1) {
      this.length[level] = step * 2 ** -level;
      this.sin[level] = Math.sin(omega * this.length[level]);
      this.cos[level] = Math.cos(omega * this.length[level]);
    }
  }
}

/**
 * Exact solution of x' = A·x + B·(sin ωt, cos ωt, 1) over any length of time up to one step.
 *
 * The exponential of the longest step is made by scaling and squaring (C. Moler, C. Van Loan, SIAM
 * Review 20 (1978) 801-836, method 3). The halves it passes on the way are kept: any shorter time is
 * put together from them, and a Taylor series over what is left. Increments e^{At} − 1 are stored
 * instead of e^{At}, so that a slow decay beside a fast one keeps its digits.
 */
export class Propagator {
  /** Level of the shortest length kept. */
  readonly halvings: number;
  /** Level after level: states×states increments. */
  private readonly own: Float64Array;
  /** Level after level: states×3 answers to sine, cosine and one. */
  private readonly driven: Float64Array;
  /** Increments over 2, 4, 8 … steps, made when asked for. */
  private readonly doublings: Float64Array[] = [];
  private readonly scratch: Float64Array;
  private readonly term: Float64Array;

  /**
   * @param a A, n×n by rows.
   * @param b B, n×3 by rows.
   * @param clock the drive's frequency and the longest length of time.
   */
  constructor(
    readonly n: number,
    readonly a: Float64Array,
    readonly b: Float64Array,
    readonly clock: StepClock,
  ) {
    let norm = 0;
    for (let i = 0; i < n; i += 1) {
      let sum = 0;
      for (let j = 0; j < n; j += 1) sum += Math.abs(a[i * n + j]);
      if (sum > norm) norm = sum;
    }
    const wanted = Math.ceil(Math.log2((norm * clock.step) / SMALL_NORM));
    this.halvings = Number.isFinite(wanted) ? Math.min(Math.max(wanted, 0), MOST_HALVINGS) : 0;
    this.scratch = new Float64Array(n);
    this.term = new Float64Array(n);
    this.own = new Float64Array((this.halvings + 1) * n * n);
    this.driven = new Float64Array((this.halvings + 1) * n * 3);
    this.series();
    for (let level = this.halvings; level > 0; level -= 1) this.square(level);
  }

  /**
   * Moves a state on in place.
   *
   * @param x state vector at the start, replaced by the one at the end.
   * @param length seconds, at most one step.
   * @param sin sin ωt at the start.
   * @param cos cos ωt at the start.
   */
  advance(x: Float64Array, length: number, sin: number, cos: number): void {
    if (length === this.clock.step) {
      this.apply(0, x, 0, sin, cos, 1);
      return;
    }
    const { clock } = this;
    let left = length;
    for (let level = 1; level <= this.halvings; level += 1) {
      const part = clock.length[level];
      if (left < part) continue;
      this.apply(level, x, 0, sin, cos, 1);
      const next = sin * clock.cos[level] + cos * clock.sin[level];
      cos = cos * clock.cos[level] - sin * clock.sin[level];
      sin = next;
      left -= part;
    }
    this.rest(x, 0, left, sin, cos, 1);
  }

  /** Moves a deviation on in place: the same without any drive. `at` is its place in `x`. */
  carry(x: Float64Array, at: number, length: number): void {
    if (length === this.clock.step) {
      this.apply(0, x, at, 0, 0, 0);
      return;
    }
    let left = length;
    for (let level = 1; level <= this.halvings; level += 1) {
      if (left < this.clock.length[level]) continue;
      this.apply(level, x, at, 0, 0, 0);
      left -= this.clock.length[level];
    }
    this.rest(x, at, left, 0, 0, 0);
  }

  /** Moves a deviation on by one level's length. */
  carryLevel(x: Float64Array, at: number, level: number): void {
    this.apply(level, x, at, 0, 0, 0);
  }

  /**
   * Multiplies a matrix from the left with the answer of a deviation over any length of time, also
   * many steps: put together from doublings and halvings of the step. What is left below the
   * shortest level is taken to second order, which serves a Newton method.
   *
   * @param m n×n, column after column.
   */
  carryAll(m: Float64Array, length: number): void {
    const { n, halvings, clock } = this;
    const { step } = clock;
    let left = length;
    let top = 0;
    while (left >= step * 2 ** (top + 1)) top += 1;
    for (let double = top; double >= 0; double -= 1) {
      const part = step * 2 ** double;
      if (left < part) continue;
      this.multiply(double === 0 ? this.own : this.doubling(double), 0, m);
      left -= part;
    }
    for (let level = 1; level <= halvings; level += 1) {
      if (left < clock.length[level]) continue;
      this.multiply(this.own, level * n * n, m);
      left -= clock.length[level];
    }
    if (left <= 0) return;
    const rest = new Float64Array(n * n);
    for (let i = 0; i < n; i += 1) {
      for (let j = 0; j < n; j += 1) {
        let sum = 0;
        for (let k = 0; k < n; k += 1) sum += this.a[i * n + k] * this.a[k * n + j];
        rest[i * n + j] = left * (this.a[i * n + j] + (left / 2) * sum);
      }
    }
    this.multiply(rest, 0, m);
  }

  /** Increment over 2^k steps. */
  private doubling(k: number): Float64Array {
    const { n, doublings } = this;
    for (let have = doublings.length; have < k; have += 1) {
      const half = have === 0 ? this.own : doublings[have - 1];
      const whole = new Float64Array(n * n);
      for (let i = 0; i < n; i += 1) {
        for (let j = 0; j < n; j += 1) {
          let sum = 2 * half[i * n + j];
          for (let q = 0; q < n; q += 1) sum += half[i * n + q] * half[q * n + j];
          whole[i * n + j] = sum;
        }
      }
      doublings.push(whole);
    }
    return doublings[k - 1];
  }

  /** m ← (1 + increment)·m, m stored column after column. */
  private multiply(increment: Float64Array, from: number, m: Float64Array): void {
    const { n, scratch } = this;
    for (let at = 0; at < n * n; at += n) {
      for (let i = 0, p = from; i < n; i += 1) {
        let sum = m[at + i];
        for (let j = 0; j < n; j += 1, p += 1) sum += increment[p] * m[at + j];
        scratch[i] = sum;
      }
      for (let i = 0; i < n; i += 1) m[at + i] = scratch[i];
    }
  }

  private apply(
    level: number,
    x: Float64Array,
    at: number,
    sin: number,
    cos: number,
    one: number,
  ): void {
    const { n, scratch, own, driven } = this;
    let p = level * n * n;
    let d = level * n * 3;
    for (let i = 0; i < n; i += 1, d += 3) {
      let sum = driven[d] * sin + driven[d + 1] * cos + driven[d + 2] * one;
      for (let j = 0; j < n; j += 1, p += 1) sum += own[p] * x[at + j];
      scratch[i] = sum;
    }
    for (let i = 0; i < n; i += 1) x[at + i] += scratch[i];
  }

  /** Taylor series over a length that is short against every time constant. */
  private rest(
    x: Float64Array,
    at: number,
    length: number,
    sin: number,
    cos: number,
    one: number,
  ): void {
    if (length <= 0) return;
    const { n, a, b, scratch, term } = this;
    const { omega } = this.clock;
    for (let i = 0; i < n; i += 1) term[i] = x[at + i];
    for (let k = 1; k <= TERMS; k += 1) {
      const factor = length / k;
      let largest = 0;
      for (let i = 0, p = 0; i < n; i += 1) {
        let sum = b[i * 3] * sin + b[i * 3 + 1] * cos + b[i * 3 + 2] * one;
        for (let j = 0; j < n; j += 1, p += 1) sum += a[p] * term[j];
        scratch[i] = sum * factor;
      }
      for (let i = 0; i < n; i += 1) {
        term[i] = scratch[i];
        x[at + i] += scratch[i];
        largest = Math.max(largest, Math.abs(scratch[i]) - 1e-17 * Math.abs(x[at + i]));
      }
      if (largest <= 0) return;
      // The drive's own derivatives, in the same scaled form.
      const next = omega * cos * factor;
      cos = -omega * sin * factor;
      sin = next;
      one = 0;
    }
  }

  /** Fills the shortest level: Horner's scheme on the series of the driven system. */
  private series(): void {
    const { n, a, b, halvings, clock } = this;
    const { omega } = clock;
    const t = clock.length[halvings];
    let x = new Float64Array(n * n);
    let y = new Float64Array(n * 3);
    let nextX = new Float64Array(n * n);
    let nextY = new Float64Array(n * 3);
    for (let i = 0; i < n; i += 1) x[i * n + i] = 1;
    // Series of the drive's rotation, scaled alike: [[p, q], [−q, p]] on (sin, cos).
    let p = 1;
    let q = 0;
    let one = 1;
    for (let k = TERMS; k >= 1; k -= 1) {
      const factor = t / k;
      for (let i = 0; i < n; i += 1) {
        for (let j = 0; j < n; j += 1) {
          let sum = 0;
          for (let m = 0; m < n; m += 1) sum += a[i * n + m] * x[m * n + j];
          nextX[i * n + j] = sum * factor;
        }
        const bs = b[i * 3];
        const bc = b[i * 3 + 1];
        let toSin = bs * p - bc * q;
        let toCos = bs * q + bc * p;
        let toOne = b[i * 3 + 2] * one;
        for (let m = 0; m < n; m += 1) {
          toSin += a[i * n + m] * y[m * 3];
          toCos += a[i * n + m] * y[m * 3 + 1];
          toOne += a[i * n + m] * y[m * 3 + 2];
        }
        nextY[i * 3] = toSin * factor;
        nextY[i * 3 + 1] = toCos * factor;
        nextY[i * 3 + 2] = toOne * factor;
      }
      // The last pass leaves out the unit matrix: the increment is kept.
      if (k > 1) for (let i = 0; i < n; i += 1) nextX[i * n + i] += 1;
      const oldP = p;
      p = 1 - omega * factor * q;
      q = omega * factor * oldP;
      one = 1;
      [x, nextX] = [nextX, x];
      [y, nextY] = [nextY, y];
    }
    this.own.set(x, halvings * n * n);
    this.driven.set(y, halvings * n * 3);
  }

  /** Fills the level above from this one: twice the length. */
  private square(level: number): void {
    const { n, own, driven, clock } = this;
    const sin = clock.sin[level];
    const cos = clock.cos[level];
    const o = level * n * n;
    const d = level * n * 3;
    const up = o - n * n;
    const upDriven = d - n * 3;
    for (let i = 0; i < n; i += 1) {
      for (let j = 0; j < n; j += 1) {
        let sum = 2 * own[o + i * n + j];
        for (let m = 0; m < n; m += 1) sum += own[o + i * n + m] * own[o + m * n + j];
        own[up + i * n + j] = sum;
      }
      const d0 = driven[d + i * 3];
      const d1 = driven[d + i * 3 + 1];
      const d2 = driven[d + i * 3 + 2];
      let toSin = d0 + d0 * cos - d1 * sin;
      let toCos = d1 + d0 * sin + d1 * cos;
      let toOne = d2 + d2;
      for (let m = 0; m < n; m += 1) {
        const factor = own[o + i * n + m];
        toSin += factor * driven[d + m * 3];
        toCos += factor * driven[d + m * 3 + 1];
        toOne += factor * driven[d + m * 3 + 2];
      }
      driven[upDriven + i * 3] = toSin;
      driven[upDriven + i * 3 + 1] = toCos;
      driven[upDriven + i * 3 + 2] = toOne;
    }
  }
}
