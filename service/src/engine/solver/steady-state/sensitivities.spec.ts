import { type BranchElement, type Field, type Request, sensitivities, solveSteadyState } from '.';
import type { SteadyState } from './steady-state';
import { BLOCKS, resistance, source } from './testing/elements';

const FIELDS: Record<BranchElement['kind'], Field[]> = {
  resistance: ['ohms'],
  capacitor: ['farads'],
  inductor: ['henries', 'ohms'],
  rectifier: ['dropVolts', 'ohms'],
  source: ['volts'],
  load: ['amps', 'volts'],
  hot: ['volts', 'amps', 'exponent'],
  ntc: ['hotOhms', 'amps', 'exponent'],
};

function valueOf(state: SteadyState, request: Request): number {
  if ('element' in request) return state.current(request.element)[request.what];
  if (request.what === 'peakToPeak') return state.pairPeakToPeak(request.a, request.b);
  return state.pair(request.a, request.b)[request.what];
}

describe('derivatives of a divider', () => {
  it('are those of the formula', () => {
    // Source: V = E·R2/(R1 + R2), so dV/d ln R1 = −V·R1/(R1 + R2); hand working.
    const elements = [source(1, 0, 100), resistance(1, 2, 1000), resistance(2, 0, 3000)];
    const state = solveSteadyState(elements, 3, 60);
    const result = sensitivities(
      state,
      [{ what: 'rms', a: 2, b: 0 }],
      [
        { element: 0, field: 'volts' },
        { element: 1, field: 'ohms' },
        { element: 2, field: 'ohms' },
      ],
    );
    expect(result[0]).toBeCloseTo(75, 3);
    expect(result[1]).toBeCloseTo(-18.75, 3);
    expect(result[2]).toBeCloseTo(18.75, 3);
  });
});

// A bridge's floating winding hangs on leakage alone between pulses; its own voltage to node 0 has
// no useful derivative, so the bridge is read at its output only.
describe.each(Object.entries(BLOCKS))('derivatives of %s', (name, { elements, nodes }) => {
  it('agree with differences of full solutions', () => {
    const exact = { tolerance: 1e-9 };
    const state = solveSteadyState(elements, nodes, 60, exact);
    const requests: Request[] = [];
    for (let node = name === 'bridge' ? 3 : 1; node < nodes; node += 1) {
      for (const what of ['mean', 'acRms', 'peakToPeak'] as const) {
        requests.push({ what, a: node, b: 0 });
      }
    }
    elements.forEach((element, k) => {
      if (element.kind === 'resistance') requests.push({ what: 'mean', element: k });
    });
    const parameters = elements.flatMap(({ kind }, element) =>
      FIELDS[kind].map((field) => ({ element, field })),
    );
    const result = sensitivities(state, requests, parameters);
    const scale = Math.max(...state.rms);
    const step = 1e-3;
    parameters.forEach(({ element, field }, p) => {
      const shifted = (by: number): SteadyState => {
        const old = elements[element] as unknown as Record<string, number>;
        const moved = elements.slice();
        moved[element] = { ...elements[element], [field]: old[field] * Math.exp(by) };
        return solveSteadyState(moved, nodes, 60, { ...exact, start: state });
      };
      const up = shifted(step);
      const down = shifted(-step);
      requests.forEach((request, r) => {
        const difference = (valueOf(up, request) - valueOf(down, request)) / (2 * step);
        // One in a thousand of the reading, or of the largest voltage where a reading is next to nothing.
        const size = 'element' in request ? 1 : scale;
        const allowed =
          0.02 * Math.abs(difference) + 1e-3 * Math.abs(valueOf(state, request)) + 3e-6 * size;
        expect(Math.abs(result[r * parameters.length + p] - difference)).toBeLessThan(allowed);
      });
    });
  });
});
