import { solveSteadyState } from '.';
import { BLOCKS } from './testing/elements';

describe.each(Object.entries(BLOCKS))('%s', (name, { elements, nodes }) => {
  const state = solveSteadyState(elements, nodes, 60);
  const mean = state.mean;

  it('settles', () => {
    expect(state.converged).toBe(true);
    expect(state.cycles).toBeLessThan(15);
  });

  // Source: conservation laws, which hold whatever the waveforms.
  it('lets no direct current through a capacitor', () => {
    elements.forEach((element, k) => {
      if (element.kind !== 'capacitor') return;
      const { mean: direct, rms } = state.current(k);
      expect(Math.abs(direct)).toBeLessThan(1e-5 * rms + 1e-9);
    });
  });

  it('has the average current times ohms across every choke', () => {
    elements.forEach((element, k) => {
      if (element.kind !== 'inductor') return;
      const across = state.pair(element.a, element.b).mean;
      expect(across).toBeCloseTo(state.current(k).mean * element.ohms, 2);
    });
  });

  it('balances the average currents at every node', () => {
    const sum = new Float64Array(nodes);
    elements.forEach(({ a, b }, k) => {
      const amps = state.current(k).mean;
      sum[a] += amps;
      sum[b] -= amps;
    });
    // Node 0 takes the 1e-12 S that hangs on every node.
    sum.forEach((amps) => expect(Math.abs(amps)).toBeLessThan(1e-8));
  });

  it('takes as much power as it gives', () => {
    const powers = elements.map((_element, k) => state.power(k));
    const given = powers.reduce((sum, watts) => sum + Math.min(watts, 0), 0);
    const taken = powers.reduce((sum, watts) => sum + Math.max(watts, 0), 0);
    expect(taken / -given).toBeCloseTo(1, 4);
  });

  it('gives its slow parts the conductance of their law', () => {
    elements.forEach((element, k) => {
      if (element.kind !== 'load' && element.kind !== 'hot') return;
      const volts = state.pair(element.a, element.b);
      const amps = state.current(k);
      const [v, i] = element.kind === 'load' ? [volts.mean, amps.mean] : [volts.rms, amps.rms];
      expect(i / (element.amps * Math.pow(v / element.volts, element.exponent))).toBeCloseTo(1, 5);
    });
  });

  it('is its own result at a quarter of the step', () => {
    const fine = solveSteadyState(elements, nodes, 60, { steps: 256, tolerance: 1e-9 });
    const scale = Math.max(...fine.rms);
    const apart = (x: Float64Array, y: Float64Array) =>
      Math.max(...x.map((value, i) => Math.abs(value - y[i]))) / scale;
    // Between pulses the bridge's floating winding hangs on leakage; its voltage there is less sharp.
    expect(apart(mean, fine.mean)).toBeLessThan(name === 'bridge' ? 2e-5 : 1e-6);
    expect(apart(state.acRms, fine.acRms)).toBeLessThan(name === 'bridge' ? 2e-5 : 1e-6);
    expect(apart(state.peakToPeak, fine.peakToPeak)).toBeLessThan(2e-6);
  });

  it('is the same from a cold start and from a neighbour', () => {
    const neighbour = solveSteadyState(
      elements.map((element) =>
        element.kind === 'capacitor' ? { ...element, farads: 0.7 * element.farads } : element,
      ),
      nodes,
      60,
    );
    const again = solveSteadyState(elements, nodes, 60, { start: neighbour });
    const scale = Math.max(...state.rms);
    again.mean.forEach((volts, i) => expect(Math.abs(volts - mean[i])).toBeLessThan(1e-6 * scale));
  });

  it('moves smoothly with its parts', () => {
    // Second differences over 2 % steps: a jump where a switching crosses a sample would show.
    const at = (percent: number) =>
      solveSteadyState(
        elements.map((element) =>
          element.kind === 'capacitor'
            ? { ...element, farads: element.farads * (1 + percent / 100) }
            : element,
        ),
        nodes,
        60,
        { start: state },
      );
    const points = [-4, -2, 0, 2, 4].map(at);
    const scale = Math.max(...state.rms);
    for (const read of [(s: typeof state) => s.mean, (s: typeof state) => s.peakToPeak]) {
      const curves = points.map(read);
      for (let node = 1; node < nodes; node += 1) {
        const [a, b, c, d, e] = curves.map((curve) => curve[node] / scale);
        const fourth = a - 4 * b + 6 * c - 4 * d + e;
        expect(Math.abs(fourth)).toBeLessThan(2e-5);
      }
    }
  });
});
