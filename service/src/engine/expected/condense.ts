import { type NodalRow, solveRows } from './algebra';
import type { Network } from './network';

/** Systems up to this size are handed over whole; the library's time grows with the cube. */
const WHOLE = 5;
/** Nodes of a group that is taken out. */
const GROUP = 2;

/**
 * Volts of every unknown node, each from equations that nerdamer solved. A large network is taken
 * apart (nested dissection, A. George, SIAM J. Numer. Anal. 10 (1973) 345-363): small groups of nodes
 * are solved for what their neighbours do to them, the neighbours see an equivalent network in their
 * place, and in the end each group is solved with its neighbours known.
 *
 * Equivalents are sums of products of positive numbers, so no digit is lost where 1 GΩ stands beside
 * 0.01 Ω.
 */
export function settle(network: Network): Float64Array {
  const n = network.leak.length;
  const volts = new Float64Array(n);
  for (const nodes of components(network)) {
    if (nodes.length <= WHOLE) {
      write(volts, nodes, solveRows(rowsOf(network, nodes, network.drive)));
      continue;
    }
    const { groups, rest } = divide(network, nodes);
    const reduced = equivalent(network, groups, rest);
    write(volts, rest, settle(reduced));
    for (const group of groups) {
      const known = Float64Array.from(group, (node) => {
        let amps = network.drive[node];
        for (const [other, siemens] of network.between[node]) {
          if (!group.includes(other)) amps += siemens * volts[other];
        }
        return amps;
      });
      write(volts, group, solveRows(rowsOf(network, group, known, true)));
    }
  }
  return volts;
}

function write(volts: Float64Array, nodes: readonly number[], values: Float64Array): void {
  nodes.forEach((node, i) => {
    volts[node] = values[i];
  });
}

/** Sets of nodes that cannot influence each other. */
function components(network: Network): number[][] {
  const seen = new Set<number>();
  const found: number[][] = [];
  network.between.forEach((_, first) => {
    if (seen.has(first)) return;
    seen.add(first);
    const nodes = [first];
    for (let head = 0; head < nodes.length; head += 1) {
      for (const other of network.between[nodes[head]].keys()) {
        if (seen.has(other)) continue;
        seen.add(other);
        nodes.push(other);
      }
    }
    found.push(nodes);
  });
  return found;
}

/** Nodal equations of some nodes; `amps` per node (`isLocal`: per place in the list). */
function rowsOf(
  network: Network,
  nodes: readonly number[],
  amps: Float64Array,
  isLocal = false,
): NodalRow[] {
  return nodes.map((node, i) => {
    const own = [network.leak[node]];
    const others = new Float64Array(nodes.length);
    for (const [other, siemens] of network.between[node]) {
      own.push(siemens);
      const j = nodes.indexOf(other);
      if (j >= 0) others[j] = siemens;
    }
    return { place: i, own, others, constant: amps[isLocal ? i : node] };
  });
}

/** Groups that touch only nodes of the rest, those with the fewest neighbours first. */
function divide(
  network: Network,
  nodes: readonly number[],
): { groups: number[][]; rest: number[] } {
  const degree = (node: number) => network.between[node].size;
  const state = new Map<number, 'group' | 'rest'>();
  const groups: number[][] = [];
  for (const first of [...nodes].sort((x, y) => degree(x) - degree(y))) {
    if (state.has(first)) continue;
    const group = [first];
    state.set(first, 'group');
    while (group.length < GROUP) {
      const around = neighbours(network, group);
      // A node joins when the group then has no more neighbours than before.
      const next = around.find(
        (node) => !state.has(node) && neighbours(network, [...group, node]).length <= around.length,
      );
      if (next === undefined) break;
      group.push(next);
      state.set(next, 'group');
    }
    neighbours(network, group).forEach((node) => state.set(node, 'rest'));
    groups.push(group);
  }
  return { groups, rest: nodes.filter((node) => state.get(node) === 'rest') };
}

function neighbours(network: Network, group: readonly number[]): number[] {
  const found = new Set(group.flatMap((node) => [...network.between[node].keys()]));
  group.forEach((node) => found.delete(node));
  return [...found];
}

/** The network of the remaining nodes, numbered anew, with equivalents in place of the groups. */
function equivalent(
  network: Network,
  groups: readonly number[][],
  rest: readonly number[],
): Network {
  const place = new Map(rest.map((node, i) => [node, i]));
  const reduced: Network = {
    between: rest.map(() => new Map<number, number>()),
    leak: Float64Array.from(rest, (node) => network.leak[node]),
    drive: Float64Array.from(rest, (node) => network.drive[node]),
  };
  rest.forEach((node, i) => {
    for (const [other, siemens] of network.between[node]) {
      const j = place.get(other);
      if (j !== undefined) reduced.between[i].set(j, siemens);
    }
  });
  for (const group of groups) takeOut(network, group, reduced, place);
  return reduced;
}

/** Adds one group's equivalent to the reduced network. */
function takeOut(
  network: Network,
  group: readonly number[],
  reduced: Network,
  place: Map<number, number>,
): void {
  const around = neighbours(network, group);
  const answer = (amps: Float64Array): Float64Array =>
    amps.some((value) => value !== 0)
      ? solveRows(rowsOf(network, group, amps, true))
      : new Float64Array(group.length);
  /** Current into a neighbour when the group's nodes stand at some volts. */
  const into = (neighbour: number, volts: Float64Array): number =>
    group.reduce((sum, node, i) => sum + (network.between[neighbour].get(node) ?? 0) * volts[i], 0);
  const byLeak = answer(Float64Array.from(group, (node) => network.leak[node]));
  const byDrive = answer(Float64Array.from(group, (node) => network.drive[node]));
  around.forEach((node) => {
    const i = place.get(node)!;
    reduced.leak[i] += into(node, byLeak);
    reduced.drive[i] += into(node, byDrive);
  });
  if (around.length < 2) return;
  around.forEach((from, k) => {
    const volts = answer(Float64Array.from(group, (node) => network.between[node].get(from) ?? 0));
    for (const to of around.slice(k + 1)) {
      const siemens = into(to, volts);
      if (siemens === 0) continue;
      const i = place.get(from)!;
      const j = place.get(to)!;
      reduced.between[i].set(j, (reduced.between[i].get(j) ?? 0) + siemens);
      reduced.between[j].set(i, (reduced.between[j].get(i) ?? 0) + siemens);
    }
  });
}
