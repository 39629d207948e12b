import { type NodalRow, solveRows } from './algebra';
import type { Network } from './network';

/** Systems up to this size are handed over whole; the library's time grows with the cube and more. */
const WHOLE = 4;

/**
 * Volts of every unknown node, each from equations that nerdamer solved. A large network is taken
 * apart first: nodes that do not touch each other, those with the fewest neighbours first, are solved
 * from their own equation for what each neighbour does to them; the neighbours see an equivalent
 * network in their place (star and mesh; A. Rosen, Journal IEE 62 (1924) 916-918, from memory), and
 * so on until few enough are left. In the end each node is solved with its neighbours known.
 *
 * Equivalents are sums of products of positive numbers, so no digit is lost where 1 GΩ stands beside
 * 0.01 Ω.
 */
export function settle(network: Network): Float64Array {
  const volts = new Float64Array(network.leak.length);
  for (const nodes of components(network)) {
    if (nodes.length <= WHOLE) {
      solveRows(rowsOf(network, nodes)).forEach((value, i) => {
        volts[nodes[i]] = value;
      });
      continue;
    }
    const { taken, rest } = divide(network, nodes);
    settle(equivalent(network, taken, rest)).forEach((value, i) => {
      volts[rest[i]] = value;
    });
    for (const node of taken) {
      let amps = network.drive[node];
      for (const [other, siemens] of network.between[node]) amps += siemens * volts[other];
      volts[node] = answer(network, node, amps);
    }
  }
  return volts;
}

/** Volts of one node when so many amps are driven into it and its neighbours stand at 0 V. */
function answer(network: Network, node: number, amps: number): number {
  if (amps === 0) return 0;
  const own = [network.leak[node], ...network.between[node].values()];
  return solveRows([{ place: 0, own, others: new Float64Array(1), constant: amps }])[0];
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

/** Nodal equations of nodes that have no other neighbours. */
function rowsOf(network: Network, nodes: readonly number[]): NodalRow[] {
  return nodes.map((node, place) => {
    const own = [network.leak[node]];
    const others = new Float64Array(nodes.length);
    for (const [other, siemens] of network.between[node]) {
      own.push(siemens);
      others[nodes.indexOf(other)] = siemens;
    }
    return { place, own, others, constant: network.drive[node] };
  });
}

/** Nodes to take out, no two of them neighbours, and those that stay. */
function divide(network: Network, nodes: readonly number[]): { taken: number[]; rest: number[] } {
  const degree = (node: number) => network.between[node].size;
  const stays = new Set<number>();
  const taken = new Set<number>();
  for (const node of [...nodes].sort((x, y) => degree(x) - degree(y))) {
    if (stays.has(node)) continue;
    taken.add(node);
    for (const other of network.between[node].keys()) stays.add(other);
  }
  return { taken: [...taken], rest: nodes.filter((node) => stays.has(node)) };
}

/** The network of the nodes that stay, numbered anew, with equivalents in place of those taken out. */
function equivalent(network: Network, taken: readonly number[], rest: readonly number[]): Network {
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
  for (const node of taken) {
    const around = [...network.between[node]].map(
      ([other, siemens]) => [place.get(other)!, siemens] as const,
    );
    const byLeak = answer(network, node, network.leak[node]);
    const byDrive = answer(network, node, network.drive[node]);
    around.forEach(([i, siemens], k) => {
      reduced.leak[i] += siemens * byLeak;
      reduced.drive[i] += siemens * byDrive;
      if (k + 1 === around.length) return;
      const share = answer(network, node, siemens);
      for (const [j, toOther] of around.slice(k + 1)) {
        const mutual = toOther * share;
        reduced.between[i].set(j, (reduced.between[i].get(j) ?? 0) + mutual);
        reduced.between[j].set(i, (reduced.between[j].get(i) ?? 0) + mutual);
      }
    });
  }
  return reduced;
}
