import { doesCross, doOverlap } from './boxes';
import { type Box, type Drawing, type Spot } from './drawing';

interface Named {
  name: string;
  box: Box;
}

/**
 * Lists everything on a drawing that lies over something else: symbols, labels and wires.
 *
 * Wires may cross wires. A wire may touch its own symbol at the terminal.
 *
 * @param drawing finished drawing.
 * @returns one line per collision, empty for a clean drawing.
 */
export function findOverlaps(
  drawing: Pick<Drawing, 'parts' | 'nodes' | 'rails' | 'sources' | 'wires'>,
): string[] {
  const symbols: Named[] = [
    ...drawing.parts.map((drawn) => ({ name: drawn.part.ref, box: drawn.box })),
    ...drawing.sources.map((source) => ({ name: 'line', box: source.box })),
    ...drawing.rails.map((rail) => ({ name: `rail ${rail.node}`, box: rail.box })),
  ];
  const labels: Named[] = [
    ...drawing.parts.map((drawn) => ({ name: `label ${drawn.part.ref}`, box: drawn.label.box })),
    ...drawing.nodes.map((node) => ({ name: `node ${node.node}`, box: node.label.box })),
    ...drawing.sources.map((source) => ({ name: 'label line', box: source.label.box })),
  ];
  const found: string[] = [];
  const all = [...symbols, ...labels];
  for (let a = 0; a < all.length; a++) {
    for (let b = a + 1; b < all.length; b++) {
      if (doOverlap(all[a].box, all[b].box)) found.push(`${all[a].name} over ${all[b].name}`);
    }
  }
  for (const wire of drawing.wires) {
    for (let index = 1; index < wire.spots.length; index++) {
      const [from, to] = [wire.spots[index - 1], wire.spots[index]];
      for (const thing of all) {
        if (doesCross(from, to, thing.box)) found.push(`wire ${wire.node} over ${thing.name}`);
      }
      found.push(...crossedPoints(drawing, wire.node, from, to));
    }
  }
  return found;
}

/** A wire that runs through another node's spot would look joined to it. */
function crossedPoints(
  drawing: Pick<Drawing, 'nodes'>,
  wireNode: string,
  from: Spot,
  to: Spot,
): string[] {
  return drawing.nodes
    .filter(
      ({ node, spot }) =>
        node !== wireNode && doesCross(from, to, { ...spot, width: 0, height: 0 }, -0.5),
    )
    .map(({ node }) => `wire ${wireNode} through node ${node}`);
}
