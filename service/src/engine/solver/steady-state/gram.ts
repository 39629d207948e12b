import type { Trace } from './trace';
import type { Network } from './network';
import { runsOf } from './runs';

/**
 * Mean over the cycle of the products ξ̃ᵢ·ξ̃ⱼ while each pattern held, ξ̃ being ξ with the states
 * counted from their value at the start of the cycle (a small ripple on a high voltage then keeps
 * its digits). From them follow mean and RMS of every voltage and current of the block.
 */
export interface Gram {
  /** Per pattern in `network.met`: width×width, symmetric. */
  products: Float64Array[];
  /** States at the start of the cycle. */
  origin: Float64Array;
}

/**
 * Gathers the products by the corrected trapezoidal rule (end derivatives included, error of fourth
 * order); no interval crosses a switching.
 */
export function gatherGram(network: Network, trace: Trace): Gram {
  const { width, states, period, omega } = network.block;
  const origin = trace.xi.slice(0, states);
  const products = network.met.map(() => new Float64Array(width * width));
  const xi = new Float64Array(width);
  const rate = new Float64Array(width);
  const add = (
    into: Float64Array,
    k: number,
    weight: number,
    rateWeight: number,
    which: number,
  ) => {
    for (let i = 0; i < width; i += 1) xi[i] = trace.xi[k * width + i];
    if (rateWeight !== 0) {
      const { a, b } = network.met[which];
      for (let i = 0; i < states; i += 1) {
        let sum = b[i * 3] * xi[states] + b[i * 3 + 1] * xi[states + 1] + b[i * 3 + 2];
        for (let j = 0; j < states; j += 1) sum += a[i * states + j] * xi[j];
        rate[i] = sum;
      }
      rate[states] = omega * xi[states + 1];
      rate[states + 1] = -omega * xi[states];
      rate[states + 2] = 0;
    }
    for (let i = 0; i < states; i += 1) xi[i] -= origin[i];
    for (let i = 0; i < width; i += 1) {
      const left = weight * xi[i] + rateWeight * rate[i];
      const right = rateWeight * xi[i];
      for (let j = 0; j <= i; j += 1) into[i * width + j] += left * xi[j] + right * rate[j];
    }
  };
  for (const run of runsOf(trace)) {
    const into = products[run.which];
    const weight = run.length / period;
    // Within a run the end derivatives of neighbours cancel.
    const ends = (run.length * weight) / 12;
    add(into, run.from, weight / 2, ends, run.which);
    for (let k = run.from + 1; k < run.to; k += 1) add(into, k, weight, 0, run.which);
    add(into, run.to, weight / 2, -ends, run.which);
  }
  for (const product of products) {
    for (let i = 0; i < width; i += 1) {
      for (let j = i + 1; j < width; j += 1) product[i * width + j] = product[j * width + i];
    }
  }
  return { products, origin };
}

/** Mean and RMS of a quantity over the cycle. */
export interface Moments {
  mean: number;
  rms: number;
  /** RMS of the part that alternates: what a meter behind a blocking capacitor sees. */
  acRms: number;
}

/**
 * Moments of a quantity given by one row over ξ per pattern.
 *
 * @param rows width numbers per pattern of `gram.products`.
 */
export function momentsOf(network: Network, gram: Gram, rows: Float64Array): Moments {
  const { width, states } = network.block;
  const count = gram.products.length;
  const shifted = rows.slice();
  for (let m = 0; m < count; m += 1) {
    for (let i = 0; i < states; i += 1) {
      shifted[m * width + width - 1] += rows[m * width + i] * gram.origin[i];
    }
  }
  let mean = 0;
  for (let m = 0; m < count; m += 1) {
    const product = gram.products[m];
    for (let i = 0; i < width; i += 1) {
      mean += shifted[m * width + i] * product[i * width + width - 1];
    }
  }
  for (let m = 0; m < count; m += 1) shifted[m * width + width - 1] -= mean;
  let square = 0;
  for (let m = 0; m < count; m += 1) {
    const product = gram.products[m];
    for (let i = 0; i < width; i += 1) {
      let sum = 0;
      for (let j = 0; j < width; j += 1) sum += product[i * width + j] * shifted[m * width + j];
      square += shifted[m * width + i] * sum;
    }
  }
  const acRms = Math.sqrt(Math.max(square, 0));
  return { mean, acRms, rms: Math.hypot(mean, acRms) };
}
