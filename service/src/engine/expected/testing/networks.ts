import type { NodalSystem } from '../types';

/** Seeded numbers between 0 and 1: the "mulberry" generator, 32 bits. */
export function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

/** A string of resistors from L at 117 V to N at 0 V with some rungs, drawn by a seeded generator. */
export function randomLadder(
  nodes: number,
  seed: number,
  ohms: (random: () => number) => number = (random) => 10 + 990 * random(),
): NodalSystem {
  const random = seeded(seed);
  const names = Array.from({ length: nodes }, (_, i) => `H${i + 1}`);
  const conductances: NodalSystem['conductances'] = [];
  const add = (a: string, b: string, value: number) => {
    const part = `R${conductances.length + 1}`;
    conductances.push({ part, a, b, siemens: 1 / value });
  };
  names.forEach((name, i) => add(i === 0 ? 'L' : names[i - 1], name, ohms(random)));
  add(names[nodes - 1], 'N', ohms(random));
  names.forEach((name) => {
    if (random() > 0.5) return;
    const other = random() < 0.5 ? 'N' : names[Math.floor(random() * nodes)];
    add(name, other, 100 * ohms(random));
  });
  return {
    nodes: ['L', 'N', ...names],
    conductances,
    fixed: { L: 117, N: 0 },
    injections: { [names[0]]: 0.02, [names[nodes - 1]]: -0.01 },
  };
}

/** Conductance matrix and currents of the unknown nodes, written out plainly for outside solvers. */
export function matrixOf(system: NodalSystem): { names: string[]; g: number[][]; i: number[] } {
  const names = system.nodes.filter((node) => !(node in system.fixed));
  const place = new Map(names.map((name, k) => [name, k]));
  const g = names.map(() => names.map(() => 0));
  const i = names.map((name) => system.injections[name] ?? 0);
  for (const { a, b, siemens } of system.conductances) {
    for (const [from, to] of [
      [a, b],
      [b, a],
    ]) {
      const row = place.get(from);
      if (row === undefined || a === b) continue;
      g[row][row] += siemens;
      const column = place.get(to);
      if (column === undefined) i[row] += siemens * system.fixed[to];
      else g[row][column] -= siemens;
    }
  }
  return { names, g, i };
}
