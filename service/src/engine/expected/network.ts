import { EngineError } from '../errors';
import type { NodalSystem } from './types';

/** Unknown nodes and what hangs on them, in numbers. */
export interface Network {
  /** Siemens between unknown nodes, both ways. */
  between: Map<number, number>[];
  /** Siemens from each unknown node to nodes of known voltage. */
  leak: Float64Array;
  /** Amps driven into each unknown node: known voltages times siemens, and injections. */
  drive: Float64Array;
}

/** A system with its unknown nodes numbered. */
export interface Numbered {
  network: Network;
  unknowns: string[];
  indexOf: Map<string, number>;
}

/**
 * Numbers the unknown nodes of a system and sums parallel conductances.
 *
 * @param drives false leaves known voltages and injections at zero, for responses.
 * @throws EngineError `island` naming nodes without a path to a known voltage.
 */
export function numbered(system: NodalSystem, drives = true): Numbered {
  const unknowns = system.nodes.filter((node) => !(node in system.fixed));
  const indexOf = new Map(unknowns.map((node, i) => [node, i]));
  const n = unknowns.length;
  const network: Network = {
    between: Array.from({ length: n }, () => new Map<number, number>()),
    leak: new Float64Array(n),
    drive: new Float64Array(n),
  };
  const toKnown = (node: number, known: string, siemens: number): void => {
    network.leak[node] += siemens;
    if (drives) network.drive[node] += siemens * (system.fixed[known] ?? 0);
  };
  for (const { a, b, siemens } of system.conductances) {
    if (a === b || siemens === 0) continue;
    const i = indexOf.get(a);
    const j = indexOf.get(b);
    if (i !== undefined && j !== undefined) connect(network, i, j, siemens);
    else if (i !== undefined) toKnown(i, b, siemens);
    else if (j !== undefined) toKnown(j, a, siemens);
  }
  if (drives) {
    for (const [node, amps] of Object.entries(system.injections)) {
      const i = indexOf.get(node);
      if (i !== undefined) network.drive[i] += amps;
    }
  }
  refuseIslands(network, unknowns);
  return { network, unknowns, indexOf };
}

/** Adds siemens between two unknown nodes. */
export function connect(network: Network, i: number, j: number, siemens: number): void {
  network.between[i].set(j, (network.between[i].get(j) ?? 0) + siemens);
  network.between[j].set(i, (network.between[j].get(i) ?? 0) + siemens);
}

function refuseIslands({ between, leak }: Network, unknowns: readonly string[]): void {
  const reached = new Set<number>();
  const queue = unknowns.map((_, i) => i).filter((i) => leak[i] > 0);
  for (let node = queue.pop(); node !== undefined; node = queue.pop()) {
    if (reached.has(node)) continue;
    reached.add(node);
    queue.push(...between[node].keys());
  }
  const island = unknowns.filter((_, i) => !reached.has(i));
  if (island.length === 0) return;
  throw new EngineError(
    'island',
    `No current can flow between ${island.join(', ')} and the rest of the circuit, so nothing sets the voltage there. Connect it or leave it out.`,
    [{ code: 'island', message: 'Nothing sets the voltage here.', nodes: island }],
  );
}
