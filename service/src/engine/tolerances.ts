/**
 * Every figure the statistics rest on, in one place. Sigmas are standard deviations of the relative
 * deviation; a uniform spread of ±t has σ = t/√3.
 */
export const SETTINGS = {
  /** A part declared open: 1 GΩ in its place (netlist document). */
  openOhms: 1e9,
  /** A part declared shorted or bridged. */
  shortOhms: 0.01,
  /** Conductance from every node to the reference, so that a cut-off island still has a voltage. */
  leastSiemens: 1e-12,
  /**
   * Spread of ln(ohms) of an open part. "Open" is anything an ohmmeter calls over range; the
   * document's 1 GΩ stands for it.
   */
  openSpread: 0.7,
  /** Line voltage: how well the day's figure holds while the readings are taken. Assumption. */
  lineSpread: 0.006,
  /**
   * Cold heater: hot ohms/6 ± 35 % is normal for a good one (audioXpress, Sept 2004, measured
   * ratios 2.7 to 7.2; the ±35 % from memory).
   */
  coldRatioSpread: 0.35 / Math.sqrt(3),
  /**
   * Exponent of I = I₀(V/V₀)^k, shared by all heaters of a set: published 0.57 to 0.70 for heaters,
   * 0.50 to 0.58 for lamps (from memory).
   */
  exponentSpread: 0.035,
  /** Closed contacts: their few hundredths of an ohm are known to a factor of about two. Assumption. */
  contactSpread: 0.5,
  /** Series resistance of a sound capacitor: known to a factor of about two. Assumption. */
  esrSpread: 0.5,
  /** Series resistance and drop of a sound rectifier around the straight-line law. Assumptions. */
  rectifierSpread: 0.25,
  dropSpread: 0.25,
  /** Unloaded volts of a secondary at the line voltage of the day. Assumption. */
  windingSpread: 0.015,
  /**
   * What the straight-line rectifier law leaves out, as a share of a reading in a rectifier block,
   * and in volts. Assumptions.
   */
  waveVagueness: 0.005,
  waveFloorVolts: 0.002,
  /** Volts of no meaning on a rail that has collapsed. Assumption. */
  collapsedVolts: 0.004,
  /** Stray current into an unconnected lead from the wiring around it, amps RMS. Assumption. */
  strayAmps: 3e-7,
  /** Chance that a reading is a slip: wrong lug, wrong range. */
  slipChance: 1 / 50,
  /** Added to ohms before the logarithm is taken, so that a dead short has one. */
  ohmsOffset: 0.5,
} as const;

/** Version of the engine, kept with every diagnosis. */
export const ENGINE_VERSION = '1.0.0';
