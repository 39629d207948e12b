import { closedFormOf, type NodalSystem, solveExpected } from '../src/engine/expected';

/** Milliseconds for one network. */
interface Timing {
  nodes: number;
  working: number;
  closedForm: number;
  residual: number;
}

/** A string with a rung at every third node. */
function network(nodes: number): NodalSystem {
  const names = Array.from({ length: nodes }, (_, i) => `H${i + 1}`);
  const all = ['L', ...names, 'N'];
  const conductances = all.slice(1).map((b, i) => ({
    part: `R${i + 1}`,
    a: all[i],
    b,
    siemens: 1 / (22 + 37.3 * i),
  }));
  names.forEach((a, i) => {
    if (i % 3 === 0)
      conductances.push({ part: `RL${i + 1}`, a, b: 'N', siemens: 1 / (4700 + 913 * i) });
  });
  return { nodes: all, conductances, fixed: { L: 117, N: 0 }, injections: {} };
}

function millisecondsOf(run: () => unknown, times: number): number {
  run();
  const begun = performance.now();
  for (let i = 0; i < times; i += 1) run();
  return (performance.now() - begun) / times;
}

/** Timings of working and closed form for networks of several sizes. */
export function benchExpected(sizes: readonly number[] = [5, 10, 20, 30]): Timing[] {
  return sizes.map((nodes) => {
    const system = network(nodes);
    const { solution, residual } = solveExpected(system, {});
    const target = { a: `H${nodes}`, b: 'N' };
    const measured = 0.8 * solution[target.a];
    return {
      nodes,
      working: millisecondsOf(() => solveExpected(system, {}), 5),
      closedForm: millisecondsOf(() => closedFormOf(system, 'R2', target, measured), 5),
      residual,
    };
  });
}

if (require.main === module) {
  console.log('nodes  working ms  closed form ms  residual');
  for (const { nodes, working, closedForm, residual } of benchExpected()) {
    console.log(
      `${String(nodes).padStart(5)}${working.toFixed(1).padStart(12)}${closedForm.toFixed(1).padStart(16)}  ${residual.toExponential(1)}`,
    );
  }
}
