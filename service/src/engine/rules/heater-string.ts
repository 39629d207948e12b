import type { Netlist, Part } from '../netlist/types';

/** Kinds that carry the heater current when they stand in a string. */
const STRING_KINDS = new Set<Part['kind']>([
  'resistor',
  'heater',
  'lamp',
  'thermistor',
  'switch',
  'fuse',
  'joint',
]);

/** One part, or the line, as an edge between two nodes. */
interface Edge {
  between: readonly [string, string];
  /** The line and windings drive current; the others only carry it. */
  isSource: boolean;
  part?: Part;
}

function edgesOf({ parts, line }: Netlist): Edge[] {
  const edges: Edge[] = line ? [{ between: [line.hot, line.return], isSource: true }] : [];
  for (const part of parts) {
    const isSource = part.kind === 'winding';
    if (part.between[0] === part.between[1]) continue;
    if (isSource || STRING_KINDS.has(part.kind)) {
      edges.push({ between: part.between, isSource, part });
    }
  }
  return edges;
}

/**
 * Cuts a graph where a single node holds it together: two edges share a block exactly when some
 * loop runs through both (J. Hopcroft, R. Tarjan, Communications of the ACM 16, 1973).
 */
function blocksOf(edges: readonly Edge[]): Edge[][] {
  const at = new Map<string, number[]>();
  edges.forEach(({ between }, e) => {
    for (const node of between) at.set(node, [...(at.get(node) ?? []), e]);
  });
  const order = new Map<string, number>();
  const low = new Map<string, number>();
  const pending: number[] = [];
  const blocks: Edge[][] = [];
  const visit = (node: string, from: number): void => {
    order.set(node, order.size);
    low.set(node, order.get(node)!);
    for (const e of at.get(node)!) {
      if (e === from) continue;
      const { between } = edges[e];
      const next = between[0] === node ? between[1] : between[0];
      if (order.has(next)) {
        if (order.get(next)! < order.get(node)!) pending.push(e);
        low.set(node, Math.min(low.get(node)!, order.get(next)!));
        continue;
      }
      const first = pending.push(e) - 1;
      visit(next, e);
      low.set(node, Math.min(low.get(node)!, low.get(next)!));
      if (low.get(next)! >= order.get(node)!) {
        blocks.push(pending.splice(first).map((index) => edges[index]));
      }
    }
  };
  for (const node of at.keys()) if (!order.has(node)) visit(node, -1);
  return blocks;
}

/** Cuts a block at the terminals of its sources, so that what lies beside a string falls away. */
function branchesOf(block: readonly Edge[]): Part[][] {
  const terminals = new Set(block.flatMap(({ between, isSource }) => (isSource ? between : [])));
  const branches: { nodes: Set<string>; parts: Part[] }[] = [];
  for (const { between, part, isSource } of block) {
    if (!part || isSource) continue;
    const inner = between.filter((node) => !terminals.has(node));
    const touching = branches.filter(({ nodes }) => inner.some((node) => nodes.has(node)));
    const joined = {
      nodes: new Set([...inner, ...touching.flatMap(({ nodes }) => [...nodes])]),
      parts: [...touching.flatMap(({ parts }) => parts), part],
    };
    for (const branch of touching) branches.splice(branches.indexOf(branch), 1);
    branches.push(joined);
  }
  return branches.map(({ parts }) => parts);
}

/**
 * Finds the parts that carry heater current: those on a loop through a source and a heater, over
 * resistances alone. A cathode resistor ends blind, a supply's parts lie behind a rectifier, and
 * what lies across the line beside the string has no heater: none of them belong to it.
 *
 * @returns references of the parts.
 */
export function stringRefs(netlist: Netlist): Set<string> {
  const refs = new Set<string>();
  for (const block of blocksOf(edgesOf(netlist))) {
    if (!block.some(({ isSource }) => isSource)) continue;
    for (const branch of branchesOf(block)) {
      if (!branch.some(({ kind }) => kind === 'heater')) continue;
      for (const { ref } of branch) refs.add(ref);
    }
  }
  return refs;
}
