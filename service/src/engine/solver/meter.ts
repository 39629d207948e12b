import type { Meter, Reading } from '../netlist/types';

/** A meter with every field settled for one reading. */
export interface SettledMeter {
  /** Conductance on a voltage reading, siemens. */
  siemens: number;
  /** Standard deviation of a reading of the given size. */
  sigma: (size: number) => number;
  overOhms: number;
}

const COUNTS = 4000;

/** Value of the last digit a 4000-count meter shows for a value of this size. */
export function lastDigit(size: number, least: number): number {
  let range = least * COUNTS;
  while (range < size && range < 1e12) range *= 10;
  return range / COUNTS;
}

/**
 * Settles a meter: left out, a 10 MΩ digital meter (DC ±0.5 % + 2 digits, AC ±1 % + 3 digits, ohms
 * ±0.8 % + 2 digits). Limits of error count as uniform, so σ is the limit over √3.
 */
export function settleMeter(reading: Pick<Reading, 'take' | 'meter'>): SettledMeter {
  const meter: Meter = reading.meter ?? {};
  const isOhms = reading.take === 'ohms' || reading.take === 'lifted-ohms';
  const isAc = reading.take === 'ac-volts' || reading.take === 'ripple-volts';
  const inputOhms =
    meter.ohms ??
    (meter.ohmsPerVolt && meter.fullScale ? meter.ohmsPerVolt * meter.fullScale : 1e7);
  const overOhms = meter.overOhms ?? 2e7;
  if (meter.fullScale !== undefined && !isOhms) {
    const limit = (meter.ofFullScale ?? meter.ofReading ?? 0.03) * meter.fullScale;
    return { siemens: 1 / inputOhms, sigma: () => limit / Math.sqrt(3), overOhms };
  }
  const ofReading = meter.ofReading ?? (isOhms ? 0.008 : isAc ? 0.01 : 0.005);
  const digits = meter.digits ?? (isAc ? 3 : 2);
  const least = isOhms ? 0.1 : 1e-4;
  return {
    siemens: 1 / inputOhms,
    sigma: (size) =>
      (ofReading * size + digits * (meter.resolution ?? lastDigit(size, least))) / Math.sqrt(3),
    overOhms,
  };
}
