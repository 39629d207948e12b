/**
 * Symmetric matrix in profile (skyline) storage with an LDLᵀ factorisation, after A. Jennings,
 * "A compact storage scheme for the solution of symmetric linear simultaneous equations",
 * Computer Journal 9 (1966) 281-285. A series string has a profile two or three wide, so that a
 * solve costs a few operations per node.
 */
export class ProfileMatrix {
  /** First column kept in each row. */
  readonly first: Int32Array;
  private readonly start: Int32Array;
  private readonly data: Float64Array;
  private readonly scratch: Float64Array;

  /**
   * Makes a zero n×n matrix that can hold the given couplings.
   *
   * @param n number of rows.
   * @param couplings pairs (i, j) that may become non-zero; the diagonal is always there.
   */
  constructor(
    readonly n: number,
    couplings: Iterable<readonly [number, number]>,
  ) {
    this.first = Int32Array.from({ length: n }, (_, i) => i);
    for (const [i, j] of couplings) {
      const row = Math.max(i, j);
      const column = Math.min(i, j);
      if (column < this.first[row]) this.first[row] = column;
    }
    this.start = new Int32Array(n + 1);
    for (let i = 0; i < n; i += 1) this.start[i + 1] = this.start[i] + (i - this.first[i] + 1);
    this.data = new Float64Array(this.start[n]);
    this.scratch = new Float64Array(n);
  }

  /** Sets every entry to zero. */
  clear(): void {
    this.data.fill(0);
  }

  /** Adds to the entry (i, j) and its mirror; the pair must be among the couplings. */
  add(i: number, j: number, value: number): void {
    const row = i >= j ? i : j;
    const column = i >= j ? j : i;
    this.data[this.start[row] + column - this.first[row]] += value;
  }

  /** Adds a conductance between two rows; −1 stands for a node of known voltage. */
  addConductance(i: number, j: number, siemens: number): void {
    if (i >= 0) this.add(i, i, siemens);
    if (j >= 0) this.add(j, j, siemens);
    if (i >= 0 && j >= 0) this.add(i, j, -siemens);
  }

  /**
   * Replaces the matrix by its factors L and D. There is no pivoting: network matrices are
   * diagonally dominant but for thermistors past their knee, where a pivot stays away from zero.
   *
   * @returns false when a pivot vanishes, that is when a node has no path to a known voltage.
   */
  factor(): boolean {
    const { n, first, start, data, scratch } = this;
    for (let i = 0; i < n; i += 1) {
      const rowStart = start[i] - first[i];
      let diagonal = data[rowStart + i];
      for (let j = first[i]; j < i; j += 1) {
        const otherStart = start[j] - first[j];
        let sum = data[rowStart + j];
        for (let k = Math.max(first[i], first[j]); k < j; k += 1) {
          sum -= scratch[k] * data[otherStart + k];
        }
        scratch[j] = sum;
      }
      for (let j = first[i]; j < i; j += 1) {
        const value = scratch[j] / data[start[j + 1] - 1];
        diagonal -= scratch[j] * value;
        data[rowStart + j] = value;
      }
      if (!Number.isFinite(diagonal) || Math.abs(diagonal) < 1e-14) return false;
      data[rowStart + i] = diagonal;
    }
    return true;
  }

  /** Solves A·x = b in place with the factors; b has length n. */
  solve(b: Float64Array): Float64Array {
    const { n, first, start, data } = this;
    for (let i = 0; i < n; i += 1) {
      const rowStart = start[i] - first[i];
      let sum = b[i];
      for (let j = first[i]; j < i; j += 1) sum -= data[rowStart + j] * b[j];
      b[i] = sum;
    }
    for (let i = 0; i < n; i += 1) b[i] /= data[start[i + 1] - 1];
    for (let i = n - 1; i > 0; i -= 1) {
      const rowStart = start[i] - first[i];
      const value = b[i];
      for (let j = first[i]; j < i; j += 1) b[j] -= data[rowStart + j] * value;
    }
    return b;
  }
}

/**
 * Orders nodes so that connected ones lie close together: reverse Cuthill-McKee (E. Cuthill,
 * J. McKee, Proc. 24th ACM National Conference, 1969). Keeps the profile of a string narrow.
 *
 * @param n number of nodes.
 * @param edges pairs of connected nodes.
 * @returns position of each node in the new order.
 */
export function narrowOrder(n: number, edges: readonly (readonly [number, number])[]): Int32Array {
  const neighbours: Set<number>[] = Array.from({ length: n }, () => new Set<number>());
  for (const [a, b] of edges) {
    neighbours[a].add(b);
    neighbours[b].add(a);
  }
  const degree = neighbours.map((set) => set.size);
  const sequence: number[] = [];
  const isSeen = new Uint8Array(n);
  const byDegree = Array.from({ length: n }, (_, i) => i).sort((x, y) => degree[x] - degree[y]);
  for (const seed of byDegree) {
    if (isSeen[seed]) continue;
    isSeen[seed] = 1;
    let head = sequence.push(seed) - 1;
    for (; head < sequence.length; head += 1) {
      const next = [...neighbours[sequence[head]]].filter((node) => !isSeen[node]);
      next.sort((x, y) => degree[x] - degree[y]);
      for (const node of next) {
        isSeen[node] = 1;
        sequence.push(node);
      }
    }
  }
  const position = new Int32Array(n);
  sequence.reverse().forEach((node, index) => {
    position[node] = index;
  });
  return position;
}
