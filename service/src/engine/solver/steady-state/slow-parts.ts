import { type ElementOf } from './elements';
import { solveDense } from './dense';

/** An element that keeps one conductance through a cycle and lets the cycle's result set it. */
export type SlowElement = ElementOf<'load'> | ElementOf<'hot'> | ElementOf<'ntc'>;

/** A load below this share of its rated voltage keeps the conductance it has there. */
const LEAST_SHARE = 1e-3;

/** Conductance and its slope d ln(siemens)/d ln(volts), volts being average (load) or RMS. */
export interface SlowPoint {
  siemens: number;
  slope: number;
}

/** Conductance a slow part begins with: its rated one. */
export function ratedSiemens(element: SlowElement): number {
  return element.kind === 'ntc' ? 1 / element.hotOhms : element.amps / element.volts;
}

/**
 * Conductance of a slow part.
 *
 * @param volts average voltage across a load, RMS voltage across a heater, lamp or thermistor.
 * @param siemens present conductance; a thermistor's law asks for its current.
 */
export function slowPoint(element: SlowElement, volts: number, siemens: number): SlowPoint {
  if (element.kind === 'ntc') {
    const amps = Math.max(Math.abs(volts) * siemens, 1e-15);
    const ohms = element.hotOhms * Math.pow(amps / element.amps, element.exponent);
    const least = element.hotOhms / 3;
    if (ohms > element.coldOhms) return { siemens: 1 / element.coldOhms, slope: 0 };
    if (ohms < least) return { siemens: 1 / least, slope: 0 };
    return { siemens: 1 / ohms, slope: -element.exponent };
  }
  const rated = element.amps / element.volts;
  if (element.kind === 'load') {
    if (element.exponent === 1) return { siemens: rated, slope: 0 };
    const share = volts / element.volts;
    const isHeld = share < LEAST_SHARE;
    return {
      siemens: rated * Math.pow(isHeld ? LEAST_SHARE : share, element.exponent - 1),
      slope: isHeld ? 0 : element.exponent - 1,
    };
  }
  const cold = rated * element.coldRatio;
  const size = Math.abs(volts) / element.volts;
  const siemensHot = size > 0 ? rated * Math.pow(size, element.exponent - 1) : Infinity;
  if (siemensHot >= cold) return { siemens: cold, slope: 0 };
  return { siemens: siemensHot, slope: element.exponent - 1 };
}

/**
 * Derivative of ln(siemens) by the logarithm of one of the part's own figures, at fixed voltage and
 * current.
 *
 * @param volts what the law was last asked with, average (load) or RMS.
 */
export function slowDerivative(
  element: SlowElement,
  field: string,
  volts: number,
  siemens: number,
): number {
  const { slope } = slowPoint(element, volts, siemens);
  const { exponent } = element;
  if (element.kind === 'ntc') {
    const amps = Math.max(Math.abs(volts) * siemens, 1e-15);
    if (slope === 0) {
      return field === (1 / siemens > element.hotOhms ? 'coldOhms' : 'hotOhms') ? -1 : 0;
    }
    if (field === 'hotOhms') return -1;
    if (field === 'amps') return exponent;
    return field === 'exponent' ? -exponent * Math.log(amps / element.amps) : 0;
  }
  if (field === 'amps') return 1;
  if (field === 'volts') return -1 - slope;
  if (slope === 0) return field === 'coldRatio' && element.kind === 'hot' ? 1 : 0;
  return field === 'exponent' ? exponent * Math.log(Math.abs(volts) / element.volts) : 0;
}

/**
 * Root finder for the logarithms of the slow parts' conductances: C. Broyden, Mathematics of
 * Computation 19 (1965) 577-593, first method, begun as a plain fixed point.
 */
export class SlowSearch {
  private readonly jacobian: Float64Array;
  private lastZ: Float64Array | undefined;
  private lastR: Float64Array | undefined;

  constructor(readonly n: number) {
    this.jacobian = new Float64Array(n * n);
    for (let i = 0; i < n; i += 1) this.jacobian[i * n + i] = -1;
  }

  /**
   * Next trial.
   *
   * @param z logarithms that were tried.
   * @param r what the law gives for the cycle they led to, less z; zero at the solution.
   */
  next(z: Float64Array, r: Float64Array): Float64Array {
    const { n, jacobian } = this;
    if (this.lastZ && this.lastR) {
      let length = 0;
      const s = z.map((value, i) => value - this.lastZ![i]);
      for (let i = 0; i < n; i += 1) length += s[i] * s[i];
      if (length > 1e-24) {
        for (let i = 0; i < n; i += 1) {
          let miss = r[i] - this.lastR[i];
          for (let j = 0; j < n; j += 1) miss -= jacobian[i * n + j] * s[j];
          for (let j = 0; j < n; j += 1) jacobian[i * n + j] += (miss * s[j]) / length;
        }
      }
    }
    this.lastZ = z.slice();
    this.lastR = r.slice();
    const step = r.map((value) => -value);
    if (!solveDense(jacobian.slice(), step, n) || step.some((value) => !Number.isFinite(value))) {
      step.set(r);
    }
    // No part changes by more than a factor of e² at once.
    const largest = step.reduce((most, value) => Math.max(most, Math.abs(value)), 0);
    const damping = largest > 2 ? 2 / largest : 1;
    return z.map((value, i) => value + damping * step[i]);
  }
}
