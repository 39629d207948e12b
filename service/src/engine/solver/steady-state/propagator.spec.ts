import { Propagator, StepClock } from './propagator';

const OMEGA = 2 * Math.PI * 60;

describe('Propagator', () => {
  it('decays by e for a time constant, in one step and in parts', () => {
    // Source: x' = −x/τ has the solution e^(−t/τ).
    const clock = new StepClock(OMEGA, 1e-3);
    const propagator = new Propagator(1, new Float64Array([-1000]), new Float64Array(3), clock);
    const x = new Float64Array([1]);
    propagator.advance(x, 1e-3, 0, 1);
    expect(x[0]).toBeCloseTo(Math.exp(-1), 12);
    propagator.advance(x, 0.37e-3, 0, 1);
    propagator.advance(x, 0.63e-3, 0, 1);
    expect(x[0]).toBeCloseTo(Math.exp(-2), 12);
  });

  it('keeps a slow decay beside a fast one', () => {
    const clock = new StepClock(OMEGA, 1e-4);
    const a = new Float64Array([-1e9, 0, 0, -1e-3]);
    const propagator = new Propagator(2, a, new Float64Array(6), clock);
    const x = new Float64Array([1, 1]);
    propagator.advance(x, 1e-4, 0, 1);
    expect(Math.abs(x[0])).toBeLessThan(1e-12);
    expect((1 - x[1]) / 1e-7).toBeCloseTo(1, 6);
  });

  it('follows a sine exactly', () => {
    // Source: x' = cos ωt integrates to sin ωt/ω.
    const clock = new StepClock(OMEGA, 2e-4);
    const propagator = new Propagator(1, new Float64Array(1), new Float64Array([0, 1, 0]), clock);
    const x = new Float64Array(1);
    let time = 0;
    for (const length of [2e-4, 1.3e-4, 2e-4, 0.01e-4]) {
      propagator.advance(x, length, Math.sin(OMEGA * time), Math.cos(OMEGA * time));
      time += length;
    }
    expect(x[0]).toBeCloseTo(Math.sin(OMEGA * time) / OMEGA, 13);
  });
});
