/**
 * Upper tail of the standard normal, P(Z > z): Abramowitz & Stegun, Handbook of Mathematical
 * Functions (1964), 7.1.26; absolute error below 1.5e-7.
 */
export function normalTail(z: number): number {
  const x = Math.abs(z) / Math.SQRT2;
  const t = 1 / (1 + 0.3275911 * x);
  const poly =
    t *
    (0.254829592 + t * (-0.284496736 + t * (1.421413741 + t * (-1.453152027 + t * 1.061405429))));
  const upper = 0.5 * poly * Math.exp(-x * x);
  return z >= 0 ? upper : 1 - upper;
}

/** ln Σ exp(xᵢ), safe for large and small values; −∞ for an empty list. */
export function logSumExp(xs: readonly number[]): number {
  let most = -Infinity;
  for (const x of xs) if (x > most) most = x;
  if (most === -Infinity) return -Infinity;
  let sum = 0;
  for (const x of xs) sum += Math.exp(x - most);
  return most + Math.log(sum);
}
