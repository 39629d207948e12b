import { type BranchElement, solveSteadyState } from '.';
import {
  BLOCKS,
  capacitor,
  choke,
  halfWave,
  rectifier,
  resistance,
  source,
} from './testing/elements';

/** A part open (1 GΩ) or shorted (0.01 Ω), as the netlist document puts it. */
const FAULTS: Record<string, number> = { open: 1e9, shorted: 0.01 };

describe.each(Object.entries(BLOCKS))('%s with one part failed', (_, { elements, nodes }) => {
  const healthy = solveSteadyState(elements, nodes, 60);

  it.each(Object.entries(FAULTS))('settles with any part %s', (_mode, ohms) => {
    elements.forEach(({ a, b, kind }, k) => {
      if (kind === 'source') return;
      const faulty: BranchElement[] = elements.slice();
      faulty[k] = { kind: 'resistance', a, b, ohms };
      const warm = solveSteadyState(faulty, nodes, 60, { start: healthy });
      const cold = solveSteadyState(faulty, nodes, 60);
      expect(warm.converged && cold.converged).toBe(true);
      const scale = Math.max(...healthy.rms);
      const means = cold.mean;
      warm.mean.forEach((volts, i) => {
        expect(Math.abs(volts - means[i])).toBeLessThan(1e-4 * scale);
      });
    });
  });
});

describe('blocks in which nothing conducts', () => {
  it('stay at rest with every rectifier open', () => {
    const elements = halfWave.elements.map((element): BranchElement =>
      element.kind === 'rectifier' ? resistance(element.a, element.b, 1e9) : element,
    );
    const state = solveSteadyState(elements, halfWave.nodes, 60, {
      start: solveSteadyState(halfWave.elements, halfWave.nodes, 60),
    });
    expect(state.converged).toBe(true);
    expect(Math.abs(state.mean[3])).toBeLessThan(1e-3);
  });

  it('give a floating island a voltage', () => {
    const elements = [source(1, 0, 100), resistance(2, 3, 100), capacitor(2, 3, 1e-6)];
    const { mean, converged } = solveSteadyState(elements, 4, 60);
    expect(converged).toBe(true);
    expect(Array.from(mean)).toEqual([0, 0, 0, 0].map(() => expect.closeTo(0, 6)));
  });

  it('work without any source or element', () => {
    expect(solveSteadyState([], 2, 60).mean[1]).toBe(0);
    const elements = [rectifier(1, 2, 10, 100), capacitor(2, 0, 1e-5), resistance(2, 0, 1e3)];
    expect(Math.abs(solveSteadyState(elements, 3, 60).mean[2])).toBeLessThan(1e-6);
  });
});

describe('drawings with awkward ends', () => {
  it('take a capacitor straight across an ideal source', () => {
    const elements = [source(1, 0, 100), capacitor(1, 0, 1e-6, 0)];
    const state = solveSteadyState(elements, 2, 60);
    // Source: I = ωCV, hand working.
    expect(state.current(1).rms).toBeCloseTo(2 * Math.PI * 60 * 1e-4, 5);
    expect(state.current(0).rms).toBeCloseTo(2 * Math.PI * 60 * 1e-4, 5);
  });

  it('take a choke that the rectifier cuts off', () => {
    const elements = [
      source(1, 0, 100),
      rectifier(1, 2, 1, 1),
      choke(2, 3, 5, 100),
      resistance(3, 0, 1e3),
    ];
    const state = solveSteadyState(elements, 4, 60);
    expect(state.converged).toBe(true);
    expect(state.current(1).mean).toBeGreaterThan(0);
    // The rectifier never carries current backwards.
    expect(Math.min(...state.currentWaveform(1).values)).toBeGreaterThan(-1e-6);
  });

  it('stack ideal sources and ignore a loop of them', () => {
    const elements = [
      source(1, 0, 50),
      source(2, 1, 50),
      source(2, 0, 100),
      resistance(2, 0, 1000),
    ];
    const { rms } = solveSteadyState(elements, 3, 60);
    expect(rms[2]).toBeCloseTo(100, 6);
  });

  it('names what did not settle by its flag', () => {
    const { converged, cycles } = solveSteadyState(halfWave.elements, halfWave.nodes, 60, {
      mostCycles: 1,
    });
    expect(converged).toBe(false);
    expect(cycles).toBe(1);
  });
});
