/**
 * Node elimination of a resistive network without a single subtraction (star-mesh steps, after
 * W. Grassmann, M. Taksar, D. Heyman, Operations Research 33 (1985) 1107-1116): the sum over a
 * node's branches is its pivot. Every conductance keeps its relative accuracy, so 1 GΩ may stand
 * beside 0.01 Ω and a node may hang on 1e-12 S alone.
 */
export class Elimination {
  private readonly between: Float64Array;
  private readonly toGround: Float64Array;
  private readonly inverse: Float64Array;

  /** A network of n nodes, each with `least` siemens to ground. */
  constructor(
    readonly n: number,
    private readonly least: number,
  ) {
    this.between = new Float64Array(n * n);
    this.toGround = new Float64Array(n);
    this.inverse = new Float64Array(n);
    this.clear();
  }

  /** Removes all branches. */
  clear(): void {
    this.between.fill(0);
    this.toGround.fill(this.least);
  }

  /** Takes over the branches of another network of the same size that is not yet eliminated. */
  copyFrom(other: Elimination): void {
    this.between.set(other.between);
    this.toGround.set(other.toGround);
  }

  /** Adds a branch between two nodes; −1 stands for ground. */
  add(i: number, j: number, siemens: number): void {
    const { n, between, toGround } = this;
    if (i === j) return;
    if (i < 0) toGround[j] += siemens;
    else if (j < 0) toGround[i] += siemens;
    else {
      between[i * n + j] += siemens;
      between[j * n + i] += siemens;
    }
  }

  /** Eliminates node after node, the last first. Needed once before `solve`. */
  factor(): void {
    const { n, between, toGround, inverse } = this;
    for (let k = n - 1; k >= 0; k -= 1) {
      const row = k * n;
      let sum = toGround[k];
      for (let j = 0; j < k; j += 1) sum += between[row + j];
      inverse[k] = 1 / sum;
      for (let i = 0; i < k; i += 1) {
        const share = between[row + i] * inverse[k];
        if (share === 0) continue;
        toGround[i] += share * toGround[k];
        const target = i * n;
        for (let j = 0; j < k; j += 1) between[target + j] += share * between[row + j];
      }
    }
  }

  /**
   * Solves for node volts in place.
   *
   * @param rhs n rows of `width` columns: amps put into each node.
   */
  solve(rhs: Float64Array, width: number): void {
    const { n, between, inverse } = this;
    for (let k = n - 1; k >= 0; k -= 1) {
      for (let i = 0; i < k; i += 1) {
        const share = between[k * n + i] * inverse[k];
        if (share === 0) continue;
        for (let c = 0; c < width; c += 1) rhs[i * width + c] += share * rhs[k * width + c];
      }
    }
    for (let k = 0; k < n; k += 1) {
      const row = k * width;
      for (let j = 0; j < k; j += 1) {
        const siemens = between[k * n + j];
        if (siemens === 0) continue;
        for (let c = 0; c < width; c += 1) rhs[row + c] += siemens * rhs[j * width + c];
      }
      for (let c = 0; c < width; c += 1) rhs[row + c] *= inverse[k];
    }
  }
}
