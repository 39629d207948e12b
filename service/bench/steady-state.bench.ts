import { sensitivities, solveSteadyState } from '../src/engine/solver/steady-state';
import type { BranchElement, ParameterOf } from '../src/engine/solver/steady-state';

/** Milliseconds per call for one block. */
interface Timing {
  block: string;
  nodes: number;
  cold: number;
  warm: number;
  cycles: number;
  sensitivities: number;
}

const half: BranchElement[] = [
  { kind: 'source', a: 1, b: 0, volts: 117, phase: 0, ohms: 0 },
  { kind: 'resistance', a: 1, b: 2, ohms: 33 },
  { kind: 'rectifier', a: 2, b: 3, dropVolts: 10, ohms: 100 },
  { kind: 'capacitor', a: 3, b: 0, farads: 50e-6, esr: 2 },
  { kind: 'load', a: 3, b: 0, amps: 0.034, volts: 120, exponent: 1.5 },
  { kind: 'resistance', a: 3, b: 4, ohms: 1500 },
  { kind: 'capacitor', a: 4, b: 0, farads: 30e-6, esr: 2 },
  { kind: 'load', a: 4, b: 0, amps: 0.016, volts: 95, exponent: 1 },
  { kind: 'resistance', a: 4, b: 5, ohms: 470e3 },
  { kind: 'load', a: 5, b: 0, amps: 1e-4, volts: 48, exponent: 1 },
  { kind: 'capacitor', a: 2, b: 0, farads: 47e-9, esr: 0.1 },
];

const doubler: BranchElement[] = [
  { kind: 'source', a: 1, b: 0, volts: 117, phase: 0, ohms: 0 },
  { kind: 'resistance', a: 1, b: 2, ohms: 0.3 },
  { kind: 'resistance', a: 2, b: 3, ohms: 4.7 },
  { kind: 'capacitor', a: 3, b: 4, farads: 150e-6, esr: 2 },
  { kind: 'rectifier', a: 0, b: 4, dropVolts: 5, ohms: 10 },
  { kind: 'rectifier', a: 4, b: 5, dropVolts: 5, ohms: 10 },
  { kind: 'capacitor', a: 5, b: 0, farads: 120e-6, esr: 2 },
  { kind: 'inductor', a: 5, b: 6, henries: 1.2, ohms: 38 },
  { kind: 'capacitor', a: 6, b: 0, farads: 100e-6, esr: 2 },
  { kind: 'load', a: 6, b: 0, amps: 0.16, volts: 235, exponent: 1 },
  { kind: 'resistance', a: 6, b: 7, ohms: 2700 },
  { kind: 'capacitor', a: 7, b: 0, farads: 40e-6, esr: 2 },
  { kind: 'load', a: 7, b: 0, amps: 0.036, volts: 140, exponent: 1 },
  { kind: 'resistance', a: 6, b: 8, ohms: 12e3 },
  { kind: 'capacitor', a: 8, b: 0, farads: 100e-9, esr: 0.1 },
  { kind: 'load', a: 8, b: 0, amps: 0.008, volts: 140, exponent: 1 },
];

const full: BranchElement[] = [
  { kind: 'source', a: 1, b: 0, volts: 330, phase: 0, ohms: 70 },
  { kind: 'source', a: 2, b: 0, volts: 330, phase: 180, ohms: 74 },
  { kind: 'rectifier', a: 1, b: 3, dropVolts: 14, ohms: 130 },
  { kind: 'rectifier', a: 2, b: 3, dropVolts: 14, ohms: 130 },
  { kind: 'capacitor', a: 3, b: 0, farads: 20e-6, esr: 2 },
  { kind: 'inductor', a: 3, b: 4, henries: 8, ohms: 210 },
  { kind: 'capacitor', a: 4, b: 0, farads: 40e-6, esr: 2 },
  { kind: 'load', a: 4, b: 0, amps: 0.072, volts: 365, exponent: 1.5 },
  { kind: 'resistance', a: 4, b: 5, ohms: 10e3 },
  { kind: 'resistance', a: 5, b: 0, ohms: 47e3 },
  { kind: 'capacitor', a: 5, b: 0, farads: 20e-6, esr: 2 },
];

/** Every capacitor 20 % down and every resistance 10 % up: what a hypothesis may ask for. */
function shifted(elements: readonly BranchElement[]): BranchElement[] {
  return elements.map((element) => {
    if (element.kind === 'capacitor') return { ...element, farads: 0.8 * element.farads };
    return element.kind === 'resistance' ? { ...element, ohms: 1.1 * element.ohms } : element;
  });
}

function millisecondsOf(run: () => unknown, times: number): number {
  for (let i = 0; i < times; i += 1) run();
  const begun = performance.now();
  for (let i = 0; i < times; i += 1) run();
  return (performance.now() - begun) / times;
}

/** Times one block: from rest, from a solved neighbour, and all its first derivatives. */
function time(block: string, elements: BranchElement[]): Timing {
  const nodes = 1 + Math.max(...elements.flatMap(({ a, b }) => [a, b]));
  const state = solveSteadyState(elements, nodes, 60);
  const start = state.warmStart;
  const other = shifted(elements);
  const requests = Array.from({ length: nodes - 1 }, (_, i) => ({
    what: 'mean' as const,
    a: i + 1,
    b: 0,
  }));
  const parameters = elements.flatMap(({ kind }, element): ParameterOf[] =>
    kind === 'resistance'
      ? [{ element, field: 'ohms' }]
      : kind === 'capacitor'
        ? [{ element, field: 'farads' }]
        : [],
  );
  const perParameter = millisecondsOf(() => sensitivities(state, requests, parameters), 200);
  return {
    block,
    nodes,
    cold: millisecondsOf(() => solveSteadyState(elements, nodes, 60), 400),
    warm: millisecondsOf(() => solveSteadyState(other, nodes, 60, { start }), 400),
    cycles: solveSteadyState(other, nodes, 60, { start }).cycles,
    sensitivities: perParameter / parameters.length,
  };
}

/** Timings of the steady state on three supplies. */
export function benchSteadyState(): Timing[] {
  return [time('half-wave', half), time('doubler', doubler), time('full-wave', full)];
}

if (require.main === module) {
  console.log('block       nodes  cold ms  warm ms  cycles  ms per derivative');
  for (const { block, nodes, cold, warm, cycles, sensitivities: each } of benchSteadyState()) {
    console.log(
      [
        block.padEnd(12),
        String(nodes).padStart(4),
        cold.toFixed(3).padStart(9),
        warm.toFixed(3).padStart(8),
        String(cycles).padStart(7),
        each.toFixed(3).padStart(9),
      ].join(''),
    );
  }
}
