import { type Netlist } from '@engine/netlist/types';
import { doCrossAny, doOverlap, textPlace } from './boxes';
import { type Box, type Sketch, type Spot, type TextPlace } from './drawing';
import { LABEL_GAP, NODE_LABEL_HEIGHT, nodeLabelWidth } from './metrics';

/**
 * Finds room for the label of each node of a drawing whose parts were placed by hand.
 *
 * Tries below, above, right and left of every wire end of the node and takes the first free place, else the
 * one that covers least.
 *
 * @param sketch parts and wires; receives the labels.
 * @param nodes nodes to label.
 */
export function addNodeLabels(sketch: Sketch, netlist: Netlist, nodes: Iterable<string>): void {
  for (const node of nodes) {
    const wires = sketch.wires.filter((wire) => wire.node === node);
    const spots = wires.flatMap((wire) => [...wire.spots, middleOf(wire.spots)]);
    const width = nodeLabelWidth(netlist, node);
    const taken = [
      ...sketch.parts.flatMap((drawn) => [drawn.box, drawn.label.box]),
      ...sketch.nodes.map((other) => other.label.box),
      ...sketch.rails.map((rail) => rail.box),
    ];
    let best: { spot: Spot; label: TextPlace; cost: number } | undefined;
    for (const spot of spots) {
      for (const label of placesAround(spot, width)) {
        const cost = costOf(label.box, taken, sketch);
        if (!best || cost < best.cost) best = { spot, label, cost };
      }
    }
    if (best) sketch.nodes.push({ node, spot: best.spot, label: best.label });
  }
}

function placesAround({ x, y }: Spot, width: number): TextPlace[] {
  const height = NODE_LABEL_HEIGHT;
  const aside = LABEL_GAP / 2 + 2;
  return [
    textPlace(x, y + aside, width, height, 'middle'),
    textPlace(x + aside, y + aside, width, height, 'start'),
    textPlace(x - aside, y + aside, width, height, 'end'),
    textPlace(x, y - aside - height, width, height, 'middle'),
    textPlace(x + aside, y - aside - height, width, height, 'start'),
    textPlace(x - aside, y - aside - height, width, height, 'end'),
  ];
}

function costOf(box: Box, taken: Box[], sketch: Sketch): number {
  const covered = taken.filter((other) => doOverlap(box, other)).length;
  const crossed = sketch.wires.filter((wire) => doCrossAny(wire.spots, box)).length;
  return 3 * covered + crossed;
}

function middleOf(spots: Spot[]): Spot {
  const [from, to] = [spots[0], spots[1] ?? spots[0]];
  return { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 };
}
