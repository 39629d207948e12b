/**
 * Current-voltage laws of hot parts, written as voltage over current: V = f(I). Newton on the
 * current settles a series string from any start, also with a part open; on the voltage it swings.
 */
export const Law = {
  /** V = I / p0, p0 in siemens. */
  Ohmic: 0,
  /** Heater or lamp: p0 volts, p1 amps, p2 exponent, p3 cold ohms. */
  Hot: 1,
  /** Thermistor: p0 hot ohms, p1 amps, p2 exponent, p3 cold ohms. */
  Ntc: 2,
  /** p0 farads, p1 series ohms, p2 leak ohms (infinite when sound). Waveform blocks only, as below. */
  Capacitor: 3,
  /** p0 drop volts, p1 ohms, p2 leak ohms; `a` is the anode. */
  Rectifier: 4,
  /** p0 henries, p1 ohms. */
  Choke: 5,
  /** p0 RMS volts at the day's line voltage, p1 ohms, p2 phase in degrees. */
  Winding: 6,
  /** p0 amps, p1 volts, p2 exponent. */
  Load: 7,
} as const;
export type Law = (typeof Law)[keyof typeof Law];

/** Voltage and slope of a law at one current. */
export interface LawPoint {
  volts: number;
  /** dV/dI in ohms. */
  slope: number;
  /** True when the part is on its cold, straight branch. */
  isCold: boolean;
}

/**
 * Heater or lamp: I = amps·(V/volts)^exponent, never below its cold resistance.
 *
 * @param i current in amps, any sign.
 * @param out receives voltage, slope and branch.
 */
export function hotLaw(
  i: number,
  volts: number,
  amps: number,
  exponent: number,
  coldOhms: number,
  out: LawPoint,
): void {
  const size = Math.abs(i);
  const coldVolts = coldOhms * size;
  const hotVolts = size > 0 ? volts * Math.pow(size / amps, 1 / exponent) : 0;
  if (hotVolts <= coldVolts) {
    out.volts = coldOhms * i;
    out.slope = coldOhms;
    out.isCold = true;
    return;
  }
  out.volts = i < 0 ? -hotVolts : hotVolts;
  out.slope = hotVolts / (exponent * size);
  out.isCold = false;
}

/**
 * Thermistor: R = hotOhms·(I/amps)^exponent, held between hotOhms/3 and coldOhms. Between its two
 * ends the slope dV/dI is negative when the exponent is below −1.
 *
 * @param i current in amps, any sign.
 * @param out receives voltage, slope and branch.
 */
export function ntcLaw(
  i: number,
  hotOhms: number,
  amps: number,
  exponent: number,
  coldOhms: number,
  out: LawPoint,
): void {
  const size = Math.abs(i);
  const free = size > 0 ? hotOhms * Math.pow(size / amps, exponent) : Infinity;
  const least = hotOhms / 3;
  const ohms = free > coldOhms ? coldOhms : free < least ? least : free;
  out.volts = ohms * i;
  out.isCold = free > coldOhms;
  out.slope = free > coldOhms || free < least ? ohms : ohms * (1 + exponent);
}
