import { textPlace } from './boxes';
import { type Sketch } from './drawing';
import { type RowRequest } from './draw-row';
import { type Partner } from './lane';
import {
  CLEARANCE,
  drawPart,
  LABEL_GAP,
  NODE_LABEL_HEIGHT,
  nodeLabelWidth,
  PART_LABEL_HEIGHT,
  SYMBOL_HALF,
  SYMBOL_LENGTH,
} from './metrics';
import { slotWidth } from './spacing';

/**
 * Draws the parts alongside a row, each above the stretch it joins; wider stretches further up.
 *
 * @param starts where each node's zone begins, by index.
 * @param ends where each node's zone ends, by index.
 * @param mainTop reach of the row itself above its line.
 * @returns reach of the row with its partners above its line.
 */
export function drawPartners(
  sketch: Sketch,
  request: RowRequest,
  starts: Map<number, number>,
  ends: Map<number, number>,
  mainTop: number,
): number {
  const partners = request.lane.partners.filter(
    (partner) => partner.from >= request.from && partner.to <= request.to,
  );
  let top = mainTop;
  for (const level of levelsOf(partners)) {
    const half = Math.max(
      ...level.flatMap((partner) => partner.parts.map((part) => SYMBOL_HALF[part.kind])),
    );
    const y = -(top + CLEARANCE + half);
    for (const partner of level) {
      drawPartner(sketch, partner, ends.get(partner.from)!, starts.get(partner.to)!, y, request);
    }
    top = -y + half + LABEL_GAP + PART_LABEL_HEIGHT;
  }
  return top;
}

/** Puts stretches that do not meet side by side, narrow ones nearest to the row. */
function levelsOf(partners: readonly Partner[]): Partner[][] {
  const levels: Partner[][] = [];
  const byWidth = [...partners].sort((a, b) => a.to - a.from - (b.to - b.from));
  for (const partner of byWidth) {
    const isFree = (level: Partner[]) =>
      level.every((other) => other.to <= partner.from || partner.to <= other.from);
    // A wide stretch may not slip below a narrow one that it spans.
    let index = levels.length;
    while (index > 0 && isFree(levels[index - 1])) index--;
    if (index === levels.length) levels.push([]);
    levels[index].push(partner);
  }
  return levels;
}

function drawPartner(
  sketch: Sketch,
  partner: Partner,
  left: number,
  right: number,
  y: number,
  request: RowRequest,
): void {
  const { netlist } = request.sheet;
  const { parts, nodes } = partner;
  const widths = parts.map(slotWidth);
  const innerWidths = nodes.slice(1, -1).map((node) => nodeLabelWidth(netlist, node) + CLEARANCE);
  const total = [...widths, ...innerWidths].reduce((sum, width) => sum + width, 0);
  let x = left + (right - left - total) / 2;
  let from = left;
  sketch.wires.push(upright(nodes[0], left, y));
  parts.forEach((part, index) => {
    const centre = x + widths[index] / 2;
    sketch.parts.push(drawPart(part, centre, y, part.between[0] === nodes[index] ? 0 : 2));
    sketch.wires.push(level(nodes[index], from, centre - SYMBOL_LENGTH / 2, y));
    from = centre + SYMBOL_LENGTH / 2;
    x += widths[index];
    if (index === parts.length - 1) return;
    const width = innerWidths[index] - CLEARANCE;
    const middle = x + innerWidths[index] / 2;
    sketch.nodes.push({
      node: nodes[index + 1],
      spot: { x: middle, y },
      label: textPlace(
        middle,
        y - LABEL_GAP - NODE_LABEL_HEIGHT,
        width,
        NODE_LABEL_HEIGHT,
        'middle',
      ),
    });
    x += innerWidths[index];
  });
  const last = nodes[nodes.length - 1];
  sketch.wires.push(level(last, from, right, y), upright(last, right, y));
}

function upright(node: string, x: number, y: number) {
  return {
    node,
    spots: [
      { x, y: 0 },
      { x, y },
    ],
  };
}

function level(node: string, from: number, to: number, y: number) {
  return {
    node,
    spots: [
      { x: from, y },
      { x: to, y },
    ],
  };
}
