import { solveDense } from './dense';

/** From this cycle on steps are tested before they are taken, and shortened. */
const PATIENCE = 16;
const LEAST_PART = 1 / 1024;

/**
 * Newton's method on the states at the start of a cycle: F(x) = end − start = 0 with the derivative
 * M − 1. Full steps settle nearly every block. Where rectifiers carry next to nothing, Newton can go
 * round in circles between two conduction patterns; steps are then shortened by the natural
 * monotonicity test (P. Deuflhard, Newton Methods for Nonlinear Problems, Springer 2004, 3.3).
 */
export class ShootingSearch {
  /** Newton step at the present start states, zero-filled when there is none. */
  readonly step: Float64Array;
  /** Largest entry of the step in volts; infinite when the linear system is singular. */
  size = Infinity;
  private readonly base: Float64Array;
  private readonly baseStep: Float64Array;
  private readonly baseMatrix: Float64Array;
  private baseSize = Infinity;
  private part = 1;
  private cycle = 0;

  /** @param weights volts that one unit of each state stands for. */
  constructor(
    readonly n: number,
    private readonly weights: Float64Array,
  ) {
    this.step = new Float64Array(n);
    this.base = new Float64Array(n);
    this.baseStep = new Float64Array(n);
    this.baseMatrix = new Float64Array(n * n);
  }

  /**
   * Takes in one cycle and works out its Newton step.
   *
   * @param x0 states it began with.
   * @param end states it ended with.
   * @param monodromy derivative of the end by the start, column after column.
   */
  observe(x0: Float64Array, end: Float64Array, monodromy: Float64Array): void {
    const { n, step } = this;
    const matrix = new Float64Array(n * n);
    for (let i = 0; i < n; i += 1) {
      step[i] = end[i] - x0[i];
      for (let j = 0; j < n; j += 1) matrix[i * n + j] = (i === j ? 1 : 0) - monodromy[j * n + i];
    }
    const isTested = this.cycle >= PATIENCE && this.baseSize < Infinity;
    const along = isTested ? step.slice() : undefined;
    this.cycle += 1;
    this.size = this.solve(matrix.slice(), step);
    if (along) {
      const sizeAlong = this.solve(this.baseMatrix.slice(), along);
      const isBetter = sizeAlong <= (1 - this.part / 4) * this.baseSize;
      if (!isBetter && this.part > LEAST_PART) {
        this.part /= 2;
        return;
      }
      this.part = Math.min(1, this.part * 2);
    }
    this.base.set(x0);
    this.baseStep.set(step);
    this.baseMatrix.set(matrix);
    this.baseSize = this.size;
  }

  /** Start states of the next cycle, written into `x0`; a plain cycle when there is no step. */
  next(x0: Float64Array, end: Float64Array): void {
    if (this.baseSize === Infinity) {
      x0.set(end);
      return;
    }
    for (let i = 0; i < this.n; i += 1) x0[i] = this.base[i] + this.part * this.baseStep[i];
  }

  /** A deviation of the states in volts. */
  measure(deviation: Float64Array): number {
    let largest = 0;
    for (let i = 0; i < this.n; i += 1) {
      largest = Math.max(largest, Math.abs(deviation[i]) * this.weights[i]);
    }
    return largest;
  }

  private solve(matrix: Float64Array, rhs: Float64Array): number {
    if (!solveDense(matrix, rhs, this.n)) {
      rhs.fill(0);
      return this.n === 0 ? 0 : Infinity;
    }
    const size = this.measure(rhs);
    return Number.isFinite(size) ? size : Infinity;
  }
}
