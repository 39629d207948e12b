import { solveSteadyState } from '.';
import { capacitor, choke, rectifier, resistance, source } from './testing/elements';

const PEAK = 100;
const VOLTS = PEAK / Math.SQRT2;

describe('rectified averages', () => {
  // Source: NEETS Module 7 (NAVEDTRA 14179), ch. 4: average 0.318 and 0.637 of the peak, effective
  // 0.707 (from memory).
  it('half-wave into a resistance averages 0.318 of the peak', () => {
    const elements = [source(1, 0, VOLTS), rectifier(1, 2, 0, 0.001), resistance(2, 0, 1000)];
    const { mean, rms } = solveSteadyState(elements, 3, 60);
    expect(mean[2]).toBeCloseTo(0.3183 * PEAK, 2);
    expect(rms[2]).toBeCloseTo(PEAK / 2, 3);
    expect(rms[1]).toBeCloseTo(0.7071 * PEAK, 2);
  });

  it('full-wave into a resistance averages 0.637 of the peak', () => {
    const elements = [
      source(1, 0, VOLTS),
      source(2, 0, VOLTS, 0, 180),
      rectifier(1, 3, 0, 0.001),
      rectifier(2, 3, 0, 0.001),
      resistance(3, 0, 1000),
    ];
    const state = solveSteadyState(elements, 4, 60);
    expect(state.mean[3]).toBeCloseTo(0.6366 * PEAK, 2);
    expect(state.rms[3]).toBeCloseTo(0.7071 * PEAK, 2);
    // What a meter behind a blocking capacitor sees: the alternating part alone.
    expect(state.acRms[3]).toBeCloseTo(Math.sqrt(0.5 - (2 / Math.PI) ** 2) * PEAK, 3);
  });
});

describe('peaks without a load', () => {
  // Source: textbook relation, an unloaded condenser charges to the peak less the rectifier's drop.
  it('half-wave', () => {
    const elements = [source(1, 0, VOLTS), rectifier(1, 2, 10, 100), capacitor(2, 0, 50e-6)];
    const state = solveSteadyState(elements, 3, 60);
    expect(state.converged).toBe(true);
    expect(state.mean[2]).toBeCloseTo(PEAK - 10, 2);
    expect(state.peakToPeak[2]).toBeLessThan(1e-3);
  });

  it('bridge, two drops', () => {
    const elements = [
      source(1, 2, VOLTS),
      rectifier(1, 3, 1, 1),
      rectifier(2, 3, 1, 1),
      rectifier(0, 1, 1, 1),
      rectifier(0, 2, 1, 1),
      capacitor(3, 0, 50e-6),
      resistance(3, 0, 1e7),
    ];
    expect(solveSteadyState(elements, 4, 60).mean[3]).toBeCloseTo(PEAK - 2, 1);
  });

  it('half-wave doubler', () => {
    const elements = [
      source(1, 0, VOLTS),
      capacitor(1, 2, 50e-6),
      rectifier(0, 2, 1, 1),
      rectifier(2, 3, 1, 1),
      capacitor(3, 0, 50e-6),
      resistance(3, 0, 1e8),
    ];
    expect(solveSteadyState(elements, 4, 60).mean[3]).toBeCloseTo(2 * (PEAK - 1), 1);
  });

  it('full-wave doubler', () => {
    const elements = [
      source(1, 2, VOLTS),
      rectifier(1, 3, 1, 1),
      rectifier(0, 1, 1, 1),
      capacitor(3, 2, 50e-6),
      capacitor(2, 0, 50e-6),
      resistance(3, 0, 1e8),
    ];
    expect(solveSteadyState(elements, 4, 60).mean[3]).toBeCloseTo(2 * (PEAK - 1), 1);
  });
});

/** Smallest positive root of tan t − t = q. */
function conductionAngle(q: number): number {
  let low = 0;
  let high = Math.PI / 2;
  for (let i = 0; i < 200; i += 1) {
    const t = (low + high) / 2;
    if (Math.tan(t) - t > q) high = t;
    else low = t;
  }
  return low;
}

describe('condenser input with a very large condenser', () => {
  // Source: O. H. Schade, "Analysis of Rectifier Operation", Proc. IRE 31 (1943) 341-361: for
  // ωCR → ∞, tan t − t = k·π·Rs/R and Edc/Epk = cos t (k = 1 half-wave, 1/2 full-wave), 2·cos t
  // with k = 2 for the doubler. The relation is the published one (from memory); no reading is
  // taken from its charts.
  const LOAD = 1000;
  const FARADS = 1;
  const ratios = [0.005, 0.01, 0.02, 0.05, 0.1, 0.2, 0.3, 0.5];

  it.each(ratios)('half-wave, Rs/R = %p', (ratio) => {
    const elements = [
      source(1, 0, VOLTS),
      rectifier(1, 2, 0, ratio * LOAD),
      capacitor(2, 0, FARADS, 0),
      resistance(2, 0, LOAD),
    ];
    const expected = Math.cos(conductionAngle(Math.PI * ratio));
    expect(solveSteadyState(elements, 3, 60).mean[2] / PEAK).toBeCloseTo(expected, 4);
  });

  it.each(ratios)('full-wave, Rs/R = %p', (ratio) => {
    const elements = [
      source(1, 0, VOLTS),
      source(2, 0, VOLTS, 0, 180),
      rectifier(1, 3, 0, ratio * LOAD),
      rectifier(2, 3, 0, ratio * LOAD),
      capacitor(3, 0, FARADS, 0),
      resistance(3, 0, LOAD),
    ];
    const expected = Math.cos(conductionAngle((Math.PI * ratio) / 2));
    expect(solveSteadyState(elements, 4, 60).mean[3] / PEAK).toBeCloseTo(expected, 4);
  });

  it.each(ratios)('full-wave doubler, Rs/R = %p', (ratio) => {
    const elements = [
      source(1, 2, VOLTS),
      rectifier(1, 3, 0, ratio * LOAD),
      rectifier(0, 1, 0, ratio * LOAD),
      capacitor(3, 2, FARADS, 0),
      capacitor(2, 0, FARADS, 0),
      resistance(3, 0, LOAD),
    ];
    const expected = 2 * Math.cos(conductionAngle(2 * Math.PI * ratio));
    expect(solveSteadyState(elements, 4, 60).mean[3] / PEAK).toBeCloseTo(expected, 4);
  });
});

describe('choke input', () => {
  // Source: critical inductance Lc = R/(6·π·f) for full wave, textbook relation (computed from the
  // stated theory). Above it the output is the average, 2/π of the peak; well below it rises.
  const LOAD = 5000;
  const critical = LOAD / (6 * Math.PI * 60);
  const output = (henries: number) => {
    const elements = [
      source(1, 0, VOLTS),
      source(2, 0, VOLTS, 0, 180),
      rectifier(1, 3, 0, 0.01),
      rectifier(2, 3, 0, 0.01),
      choke(3, 4, henries, 0.01),
      capacitor(4, 0, 1e-3, 0.01),
      resistance(4, 0, LOAD),
    ];
    return solveSteadyState(elements, 5, 60).mean[4] / PEAK;
  };

  it('gives the average above the critical inductance and more below it', () => {
    expect(critical).toBeCloseTo(4.42, 2);
    expect(output(1.5 * critical)).toBeCloseTo(2 / Math.PI, 3);
    expect(output(critical / 4)).toBeGreaterThan(1.1 * (2 / Math.PI));
  });
});
