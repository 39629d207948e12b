import { type Part } from '@engine/netlist/types';
import { otherEnd, partsByNode } from '@/lib/bench/graph';

/** A way through the circuit: one node more than parts. */
export interface Path {
  nodes: string[];
  parts: Part[];
}

/** Steps after which the search is content with the best way found so far. */
const SEARCH_STEPS = 60_000;

/**
 * Finds the way that a figure is drawn along: the one through the most series parts.
 *
 * Lamps, capacitors and loads count little, so that a lamp across a dropper section is drawn beside it
 * and not the other way round. A way enters a rail only as its last step.
 *
 * @param parts parts of the figure.
 * @param start first node.
 * @param rails nodes that end the way.
 * @param endsOnRail true for a string, which must end on a rail; false for a supply, which ends on its
 *   last node before one.
 * @returns the way, or null when no way ends as asked.
 */
export function mainPath(
  parts: readonly Part[],
  start: string,
  rails: ReadonlySet<string>,
  endsOnRail: boolean,
): Path | null {
  const byNode = partsByNode(parts);
  let best: { path: Path; weight: number } | null = null;
  let steps = 0;
  const nodes = [start];
  const taken: Part[] = [];

  const offer = (weight: number) => {
    if (!best || weight > best.weight + 1e-9) {
      best = { path: { nodes: [...nodes], parts: [...taken] }, weight };
    }
  };
  const walk = (node: string, weight: number) => {
    if (++steps > SEARCH_STEPS) return;
    const isRail = nodes.length > 1 && rails.has(node);
    if (isRail === endsOnRail && nodes.length > 1) offer(weight);
    if (isRail) return;
    for (const part of heaviestWays(byNode.get(node) ?? [], node)) {
      const next = otherEnd(part, node);
      if (nodes.includes(next) || (!endsOnRail && rails.has(next))) continue;
      nodes.push(next);
      taken.push(part);
      walk(next, weight + seriesWeight(part));
      nodes.pop();
      taken.pop();
    }
  };
  walk(start, 0);
  return (best as { path: Path } | null)?.path ?? null;
}

/** The heaviest part towards each neighbour, heaviest first: parallel ones differ in nothing else. */
function heaviestWays(parts: readonly Part[], node: string): Part[] {
  const ways = new Map<string, Part>();
  for (const part of parts) {
    const next = otherEnd(part, node);
    const rival = ways.get(next);
    if (next !== node && (!rival || seriesWeight(part) > seriesWeight(rival))) ways.set(next, part);
  }
  return [...ways.values()].sort((a, b) => seriesWeight(b) - seriesWeight(a));
}

function seriesWeight(part: Part): number {
  switch (part.kind) {
    case 'lamp':
      return 0.4;
    case 'capacitor':
    case 'load':
      return 0.3;
    case 'winding':
      return 0.6;
    default:
      return part.assembly ? 1.02 : 1;
  }
}
