/**
 * Solves A·X = B in place: rows scaled by their largest entry, partial pivoting (G. Golub, C. Van
 * Loan, Matrix Computations, 3.4).
 *
 * @param a n×n by rows, destroyed.
 * @param b n×columns by rows, replaced by the solution.
 * @returns false when A is singular; b is then meaningless.
 */
export function solveDense(a: Float64Array, b: Float64Array, n: number, columns = 1): boolean {
  for (let i = 0; i < n; i += 1) {
    let largest = 0;
    for (let j = 0; j < n; j += 1) largest = Math.max(largest, Math.abs(a[i * n + j]));
    if (!(largest > 0) || !Number.isFinite(largest)) return false;
    for (let j = 0; j < n; j += 1) a[i * n + j] /= largest;
    for (let c = 0; c < columns; c += 1) b[i * columns + c] /= largest;
  }
  for (let k = 0; k < n; k += 1) {
    let pivot = k;
    for (let i = k + 1; i < n; i += 1) {
      if (Math.abs(a[i * n + k]) > Math.abs(a[pivot * n + k])) pivot = i;
    }
    if (a[pivot * n + k] === 0) return false;
    if (pivot !== k) {
      swapRows(a, k, pivot, n);
      swapRows(b, k, pivot, columns);
    }
    for (let i = k + 1; i < n; i += 1) {
      const factor = a[i * n + k] / a[k * n + k];
      if (factor === 0) continue;
      for (let j = k; j < n; j += 1) a[i * n + j] -= factor * a[k * n + j];
      for (let c = 0; c < columns; c += 1) b[i * columns + c] -= factor * b[k * columns + c];
    }
  }
  for (let k = n - 1; k >= 0; k -= 1) {
    for (let c = 0; c < columns; c += 1) {
      let sum = b[k * columns + c];
      for (let j = k + 1; j < n; j += 1) sum -= a[k * n + j] * b[j * columns + c];
      b[k * columns + c] = sum / a[k * n + k];
    }
  }
  return true;
}

function swapRows(m: Float64Array, i: number, j: number, width: number): void {
  for (let c = 0; c < width; c += 1) {
    const held = m[i * width + c];
    m[i * width + c] = m[j * width + c];
    m[j * width + c] = held;
  }
}

/** Scalar product of a row of `rows` with a vector inside `values`. */
export function dot(
  rows: Float64Array,
  row: number,
  values: Float64Array,
  at: number,
  width: number,
): number {
  let sum = 0;
  for (let c = 0; c < width; c += 1) sum += rows[row + c] * values[at + c];
  return sum;
}
