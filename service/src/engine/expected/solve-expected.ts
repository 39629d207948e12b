import { settle } from './condense';
import { equationsOf, notesOf } from './equations';
import { figures } from './formula';
import { numbered } from './network';
import type { NodalSystem, Working } from './types';

/** The equations must hold to this fraction of their largest term. */
export const MOST_RESIDUAL = 1e-9;
/** nerdamer and the numeric engine must agree to this fraction. */
export const AGREEMENT = 1e-6;
/** A voltage below this fraction of the largest one is compared with that size instead of its own. */
const SMALL = 1e-3;

/**
 * Expected node voltages from the nodal equations, solved by nerdamer, with the equations as a
 * person reads them.
 *
 * @param system the network at its operating point.
 * @param check volts of the same nodes from the numeric engine; nodes left out are not compared.
 * @param agreement largest relative difference from `check` that counts as agreeing.
 * @returns volts of every node. `agreesWithSolver` is false, and a note says where, when an answer
 *   differs from `check` by more than 1e-6 or misses its equations by more than 1e-9.
 * @throws EngineError `island` or `no-distinct-solution` when the equations have no single solution.
 */
export function solveExpected(
  system: NodalSystem,
  check: Record<string, number>,
  agreement = AGREEMENT,
): Working {
  const { network, unknowns } = numbered(system);
  const volts = settle(network);
  const solution: Record<string, number> = {};
  for (const node of system.nodes) if (node in system.fixed) solution[node] = system.fixed[node];
  unknowns.forEach((node, i) => {
    solution[node] = volts[i];
  });
  const residual = residualOf(system, solution);
  const notes = notesOf(system);
  const differences = differencesOf(solution, check, agreement);
  if (residual.size > MOST_RESIDUAL) {
    notes.push(
      `The solution misses the equation of ${residual.node} by ${figures(residual.size, 2)} of its largest term. Do not rely on these values.`,
    );
  }
  notes.push(...differences);
  return {
    nodes: system.nodes.slice(),
    equations: equationsOf(system),
    solution,
    notes,
    residual: residual.size,
    agreesWithSolver: differences.length === 0 && residual.size <= MOST_RESIDUAL,
  };
}

/** The worst equation: what is left of it over its largest term. */
export function residualOf(
  system: NodalSystem,
  solution: Record<string, number>,
): { size: number; node: string } {
  const left = new Map<string, { sum: number; largest: number }>();
  const add = (node: string, amps: number): void => {
    if (node in system.fixed) return;
    const entry = left.get(node) ?? { sum: 0, largest: 0 };
    entry.sum += amps;
    entry.largest = Math.max(entry.largest, Math.abs(amps));
    left.set(node, entry);
  };
  for (const { a, b, siemens } of system.conductances) {
    if (a === b) continue;
    // Each collected term by itself: siemens times one node's voltage.
    add(a, siemens * solution[b]);
    add(a, -siemens * solution[a]);
    add(b, siemens * solution[a]);
    add(b, -siemens * solution[b]);
  }
  for (const [node, amps] of Object.entries(system.injections)) add(node, amps);
  let worst = { size: 0, node: '' };
  for (const [node, { sum, largest }] of left) {
    const size = largest > 0 ? Math.abs(sum) / largest : 0;
    if (!(size <= worst.size)) worst = { size, node };
  }
  return worst;
}

function differencesOf(
  solution: Record<string, number>,
  check: Record<string, number>,
  agreement: number,
): string[] {
  const largest = Object.values(solution).reduce((most, v) => Math.max(most, Math.abs(v)), 0);
  return Object.entries(check)
    .filter(([node]) => node in solution)
    .filter(([node, volts]) => {
      const size = Math.max(Math.abs(volts), Math.abs(solution[node]), SMALL * largest);
      return !(Math.abs(solution[node] - volts) <= agreement * size);
    })
    .map(
      ([node, volts]) =>
        `At ${node} the equations give ${figures(solution[node], 7)} V and the numeric engine ${figures(volts, 7)} V. One of the two is wrong; take neither as the expected value.`,
    );
}
