import { textPlace } from './boxes';
import { type RailSymbol, type Sketch, type Spot } from './drawing';
import { type Column } from './lane';
import {
  drawPart,
  LABEL_GAP,
  LINE_HEIGHT,
  lineLabel,
  NODE_LABEL_HEIGHT,
  nodeLabelWidth,
  PART_LABEL_HEIGHT,
  RAIL_HEIGHT,
  SYMBOL_LENGTH,
  textWidth,
} from './metrics';
import { type Sheet } from './spacing';

const TAIL = 10;
const INNER_GAP = NODE_LABEL_HEIGHT + 16;

/** Height of a column from its first symbol to the end of its rail symbol, px. */
export function columnHeight(column: Column): number {
  const count = Math.max(1, column.parts.length);
  return count * SYMBOL_LENGTH + (count - 1) * INNER_GAP + TAIL + RAIL_HEIGHT;
}

/**
 * Draws parts hanging from a spot down to a rail.
 *
 * @param sketch receives parts, wires and the rail's symbol.
 * @param column parts from top to bottom; none stands for the line itself.
 * @param x axis of the column.
 * @param from y where the wire leaves the node above.
 * @param top y where the first symbol begins.
 * @param rails nodes that end a column.
 */
export function drawColumn(
  sketch: Sketch,
  column: Column,
  x: number,
  from: number,
  top: number,
  rails: ReadonlySet<string>,
  sheet: Sheet,
): void {
  let y = top;
  wire(sketch, column.nodes[0], { x, y: from }, { x, y });
  if (column.parts.length === 0) {
    drawSource(sketch, x, y + SYMBOL_LENGTH / 2, sheet);
    y += SYMBOL_LENGTH;
  }
  column.parts.forEach((part, index) => {
    const turn = part.between[0] === column.nodes[index] ? 1 : 3;
    sketch.parts.push(drawPart(part, x, y + SYMBOL_LENGTH / 2, turn));
    y += SYMBOL_LENGTH;
    if (index === column.parts.length - 1) return;
    const node = column.nodes[index + 1];
    wire(sketch, node, { x, y }, { x, y: y + INNER_GAP });
    sketch.nodes.push({
      node,
      spot: { x, y: y + INNER_GAP / 2 },
      label: textPlace(
        x + LABEL_GAP,
        y + 8,
        nodeLabelWidth(sheet.netlist, node),
        NODE_LABEL_HEIGHT,
        'start',
      ),
    });
    y += INNER_GAP;
  });
  const last = column.nodes[column.nodes.length - 1];
  wire(sketch, last, { x, y }, { x, y: y + TAIL });
  const isNamed = last !== sheet.netlist.reference;
  const spot = { x, y: y + TAIL };
  sketch.rails.push(railSymbol(last, spot, rails, isNamed, sheet.netlist.reference));
}

/** Makes the symbol at the end of a wire, below the given spot. */
export function railSymbol(
  node: string,
  spot: Spot,
  rails: ReadonlySet<string>,
  isNamed: boolean,
  reference: string,
): RailSymbol {
  const width = isNamed ? Math.max(28, textWidth(node)) : 28;
  const height = RAIL_HEIGHT + (isNamed ? LINE_HEIGHT : 0);
  const kind = node === reference ? 'reference' : rails.has(node) ? 'flag' : 'loose';
  const box = { x: spot.x - width / 2, y: spot.y, width, height };
  return { node, kind, side: 'below', spot, isNamed, box };
}

/** Makes the named flag that begins a figure fed from elsewhere, to the left of the given spot. */
export function startFlag(node: string, spot: Spot): RailSymbol {
  const width = textWidth(node) + 24;
  const height = RAIL_HEIGHT;
  const box = { x: spot.x - width, y: spot.y - height / 2, width, height };
  return { node, kind: 'flag', side: 'left', spot, isNamed: true, box };
}

function drawSource(sketch: Sketch, x: number, y: number, sheet: Sheet): void {
  const half = 18;
  const width = sheet.line ? Math.max(...lineLabel(sheet.line).map(textWidth)) : 0;
  sketch.sources.push({
    x,
    y,
    box: { x: x - half, y: y - SYMBOL_LENGTH / 2, width: 2 * half, height: SYMBOL_LENGTH },
    label: textPlace(
      x + half + LABEL_GAP,
      y - LINE_HEIGHT,
      width,
      PART_LABEL_HEIGHT - LINE_HEIGHT,
      'start',
    ),
  });
}

function wire(sketch: Sketch, node: string, from: Spot, to: Spot): void {
  sketch.wires.push({ node, spots: [from, to] });
}
