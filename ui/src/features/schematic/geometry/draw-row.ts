import { textPlace } from './boxes';
import { emptySketch, type Sketch } from './drawing';
import { columnHeight, drawColumn, railSymbol, startFlag } from './draw-column';
import { drawPartners } from './draw-partners';
import { type Drop, type Lane } from './lane';
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
import { type DropSpacing, type LaneSpacing, type Sheet } from './spacing';

/** A stretch of a lane to draw along y = 0, its first node at x = 0. */
export interface RowRequest {
  lane: Lane;
  spacing: LaneSpacing;
  sheet: Sheet;
  rails: ReadonlySet<string>;
  /** Index of the first and the last node of the row. */
  from: number;
  to: number;
  /** False when another row or lane has labelled the first node already. */
  hasFirstNode: boolean;
  /** False when the next row goes on from the last node. */
  hasLastNode: boolean;
  /** Added to each gap, so that rows end below each other. */
  stretch: number;
}

/** A drawn row and its reach above and below y = 0. */
export interface Row {
  sketch: Sketch;
  /** Where each node's zone begins and ends, by index in the lane. */
  starts: Map<number, number>;
  ends: Map<number, number>;
  width: number;
  top: number;
  bottom: number;
}

const NODE_LABEL_DROP = 8;

/** Draws one row: parts in line, partners above, labels and columns below. */
export function drawRow(request: RowRequest): Row {
  const { lane, spacing, sheet, rails, from, to, stretch } = request;
  const sketch = emptySketch();
  const starts = new Map<number, number>();
  const ends = new Map<number, number>();
  const parts = lane.parts.slice(from, to);
  const half = Math.max(10, ...parts.map((part) => SYMBOL_HALF[part.kind]));
  const labelTop = half + NODE_LABEL_DROP;
  const columnTop = labelTop + NODE_LABEL_HEIGHT + 8;
  const drawDrop = (drop: Drop, at: DropSpacing, x: number, startY: number, busY: number) => {
    const last = x + at.offsets[at.offsets.length - 1];
    if (startY !== busY) wire(sketch, drop.node, x, startY, x, busY);
    if (last > x) wire(sketch, drop.node, x, busY, last, busY);
    drop.columns.forEach((column, index) =>
      drawColumn(sketch, column, x + at.offsets[index], busY, columnTop, rails, sheet),
    );
  };

  let x = 0;
  for (let index = from; index <= to; index++) {
    const node = lane.nodes[index];
    const isDrawn =
      index === from ? request.hasFirstNode : index === to ? request.hasLastNode : true;
    const isRailEnd = index === to && index > 0 && rails.has(node) && request.hasLastNode;
    const drop = isDrawn ? lane.drops.get(index) : undefined;
    const zone = drop ? spacing.zones[index] : 0;
    starts.set(index, x);
    ends.set(index, x + zone);
    if (drop) drawDrop(drop, spacing.drops.get(index)!, x, 0, 0);
    if (isRailEnd) {
      wire(sketch, node, x, 0, x, half);
      const isNamed = true;
      sketch.rails.push(railSymbol(node, { x, y: half }, rails, isNamed, sheet.netlist.reference));
    } else if (isFedFlag(request, index)) {
      sketch.rails.push(startFlag(node, { x, y: 0 }));
    } else if (isDrawn) {
      const width = nodeLabelWidth(sheet.netlist, node);
      const label = drop
        ? textPlace(x + LABEL_GAP, labelTop, width, NODE_LABEL_HEIGHT, 'start')
        : textPlace(x, labelTop, width, NODE_LABEL_HEIGHT, 'middle');
      sketch.nodes.push({ node, spot: { x, y: 0 }, label });
    }
    x += zone;
    if (index === to) break;

    const part = lane.parts[index];
    const gap = spacing.gaps[index] + stretch;
    const centre = x + spacing.centres[index] + stretch / 2;
    const turn = part.between[0] === node ? 0 : 2;
    sketch.parts.push(drawPart(part, centre, 0, turn));
    wire(sketch, node, x, 0, centre - SYMBOL_LENGTH / 2, 0);
    wire(sketch, lane.nodes[index + 1], centre + SYMBOL_LENGTH / 2, 0, x + gap, 0);
    const cathode = lane.cathodes.get(index);
    if (cathode) {
      drawDrop(cathode, spacing.cathodes.get(index)!, centre, SYMBOL_HALF.heater, columnTop - 4);
      const width = nodeLabelWidth(sheet.netlist, cathode.node);
      sketch.nodes.push({
        node: cathode.node,
        spot: { x: centre, y: columnTop - 4 },
        label: textPlace(centre + LABEL_GAP, labelTop, width, NODE_LABEL_HEIGHT - 8, 'start'),
      });
    }
    x += gap;
  }

  const top = drawPartners(sketch, request, starts, ends, half + LABEL_GAP + PART_LABEL_HEIGHT);
  return { sketch, starts, ends, width: x, top, bottom: bottomOf(request, columnTop) };
}

/** True at the start of a figure that is fed from a rail drawn elsewhere. */
function isFedFlag({ lane, rails, hasFirstNode }: RowRequest, index: number): boolean {
  const isStart = index === 0 && hasFirstNode && rails.has(lane.nodes[0]);
  return isStart && !lane.drops.get(0)?.columns.some((column) => column.parts.length === 0);
}

/** How far a row reaches below its line. */
function bottomOf(request: RowRequest, columnTop: number): number {
  const { lane, from, to } = request;
  const columns: number[] = [];
  for (let index = from; index <= to; index++) {
    const isElsewhere =
      (index === from && !request.hasFirstNode) || (index === to && !request.hasLastNode);
    if (!isElsewhere) columns.push(...(lane.drops.get(index)?.columns ?? []).map(columnHeight));
    if (index < to) columns.push(...(lane.cathodes.get(index)?.columns ?? []).map(columnHeight));
  }
  return columns.length > 0 ? columnTop + Math.max(...columns) + CLEARANCE : columnTop + CLEARANCE;
}

function wire(sketch: Sketch, node: string, x1: number, y1: number, x2: number, y2: number): void {
  if (x1 === x2 && y1 === y2) return;
  sketch.wires.push({
    node,
    spots: [
      { x: x1, y: y1 },
      { x: x2, y: y2 },
    ],
  });
}
