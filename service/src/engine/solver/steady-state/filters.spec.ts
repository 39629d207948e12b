import { solveSteadyState } from '.';
import { capacitor, choke, rectifier, resistance, source } from './testing/elements';

const OMEGA = 2 * Math.PI * 60;

describe('linear blocks have their closed forms', () => {
  // Source: complex impedances, hand working.
  it('RC divider', () => {
    const elements = [source(1, 0, 100), resistance(1, 2, 2200), capacitor(2, 0, 1e-6, 0)];
    const state = solveSteadyState(elements, 3, 60);
    const expected = 100 / Math.hypot(1, OMEGA * 2200e-6);
    // A capacitor has at least 1e-5 of its reactance in series.
    expect(state.acRms[2] / expected).toBeCloseTo(1, 5);
    expect(state.peakToPeak[2] / (2 * Math.SQRT2 * expected)).toBeCloseTo(1, 5);
    expect(state.branchRms[1] / (expected * OMEGA * 1e-6)).toBeCloseTo(1, 5);
    expect(Math.abs(state.mean[2])).toBeLessThan(1e-9);
  });

  it('RL divider', () => {
    const elements = [source(1, 0, 100), choke(1, 2, 2, 50), resistance(2, 0, 1000)];
    const { acRms } = solveSteadyState(elements, 3, 60);
    // The core loss that keeps a cut-off choke finite is a thousandth of its reactance.
    const expected = 100_000 / Math.hypot(1050 + (2 * OMEGA) / 1000, 2 * OMEGA);
    expect(acRms[2] / expected).toBeCloseTo(1, 5);
  });

  it('LC section at twice the line frequency', () => {
    // Source: attenuation 1/(ω²LC − 1) = 0.01791 for 10 H, 10 µF at 120 Hz (computed from theory).
    const elements = [source(1, 0, 10), choke(1, 2, 10, 0.001), capacitor(2, 0, 10e-6, 0.001)];
    expect(solveSteadyState(elements, 3, 120).acRms[2] / 10).toBeCloseTo(0.01791, 5);
  });

  it('power is V²/R', () => {
    const elements = [source(1, 0, 120), resistance(1, 2, 5), resistance(2, 0, 25)];
    const state = solveSteadyState(elements, 3, 60);
    expect(state.power(1)).toBeCloseTo(80, 6);
    expect(state.power(0)).toBeCloseTo(-480, 6);
  });
});

describe('ripple of a condenser-input filter', () => {
  // Source: ΔV = I/(f·C) is an upper bound, since the condenser also charges for part of the cycle;
  // 60 mA, 40 µF, 120 Hz give 12.5 V (computed from the stated theory).
  it('stays below I/(f·C) and comes near it', () => {
    const elements = [
      source(1, 0, 300),
      source(2, 0, 300, 0, 180),
      rectifier(1, 3, 0, 5),
      rectifier(2, 3, 0, 5),
      capacitor(3, 0, 40e-6, 0.01),
      resistance(3, 0, 6800),
    ];
    const state = solveSteadyState(elements, 4, 60);
    const bound = state.current(5).mean / (120 * 40e-6);
    expect(bound).toBeCloseTo(12.5, 0);
    expect(state.peakToPeak[3]).toBeLessThan(bound);
    expect(state.peakToPeak[3]).toBeGreaterThan(0.8 * bound);
  });
});

describe('a slow filter', () => {
  it('is exact though its time constant is hours', () => {
    // 1 GΩ in place of a filter resistor: 40 000 s with 40 µF. Source: divider, hand working.
    const elements = [
      source(1, 0, 100),
      rectifier(1, 2, 0, 1),
      resistance(2, 0, 1000),
      resistance(2, 3, 1e9),
      capacitor(3, 0, 40e-6),
      resistance(3, 0, 1e9),
    ];
    const state = solveSteadyState(elements, 4, 60);
    expect(state.converged).toBe(true);
    // Every node has 1e-12 S to the reference, a thousandth of the upper 1e-9 S.
    expect(state.mean[3] / state.mean[2]).toBeCloseTo(1 / 2.001, 6);
  });
});
