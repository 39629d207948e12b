import type { Circuit } from './circuit';

/**
 * Order in which a person walks the nodes: breadth first from the line's hot side, or from the
 * reference where there is no line.
 *
 * @returns rank of every node by name, 0 for the first.
 */
export function alongTheCircuit(circuit: Circuit): Map<string, number> {
  const start = circuit.hot >= 0 ? circuit.hot : circuit.reference;
  const end = circuit.hot >= 0 ? circuit.return : -1;
  const rank = new Map<string, number>([[circuit.nodes[start], 0]]);
  const queue = [start];
  for (let head = 0; head < queue.length; head += 1) {
    for (const { a, b, isLeak } of circuit.branches) {
      if (isLeak) continue;
      const next = a === queue[head] ? b : b === queue[head] ? a : -1;
      if (next < 0 || rank.has(circuit.nodes[next])) continue;
      rank.set(circuit.nodes[next], rank.size);
      // The return touches both ends of everything; going through it would walk backwards.
      if (next !== end && next !== circuit.reference) queue.push(next);
    }
  }
  for (const node of circuit.nodes) if (!rank.has(node)) rank.set(node, rank.size);
  return rank;
}
