import { addSketch, emptySketch, type Sketch } from './drawing';
import { drawRow, type Row } from './draw-row';
import { type Lane } from './lane';
import { CLEARANCE } from './metrics';
import { mirrored, moved } from './place-sketch';
import { type LaneSpacing, type Sheet, spaceLane } from './spacing';

/** A figure on the sheet; y = 0 is the line of its first row. */
export interface Figure {
  sketch: Sketch;
  top: number;
  bottom: number;
}

/**
 * Draws a string wrapped into rows that run left to right and back, like a winding road.
 *
 * @param width room in px; a stretch with a part alongside is never broken, so a row may be wider.
 */
export function drawString(
  lane: Lane,
  sheet: Sheet,
  rails: ReadonlySet<string>,
  width: number,
): Figure {
  const spacing = spaceLane(lane, sheet);
  const rows = breakRows(lane, spacing, width);
  const naturals = rows.map(([from, to]) => naturalWidth(spacing, from, to));
  const common = Math.max(...naturals);
  const sketch = emptySketch();
  let y = 0;
  let first = 0;
  let bottom = 0;
  rows.forEach(([from, to], index) => {
    const isLast = index === rows.length - 1;
    const stretch = isLast && rows.length > 1 ? 0 : (common - naturals[index]) / (to - from);
    const hasFirstNode = true;
    const row = drawRow({
      ...{ lane, spacing, sheet, rails, from, to, hasFirstNode, stretch },
      hasLastNode: isLast,
    });
    if (index > 0) {
      const before = y;
      y += bottom + row.top + CLEARANCE;
      const x = index % 2 === 1 ? common : 0;
      const node = lane.nodes[from];
      sketch.wires.push({
        node,
        spots: [
          { x, y: before },
          { x, y },
        ],
      });
    } else {
      first = row.top;
    }
    bottom = row.bottom;
    const placed = index % 2 === 1 ? mirrored(row.sketch, common / 2) : row.sketch;
    addSketch(sketch, moved(placed, 0, y));
  });
  return { sketch, top: first, bottom: y + bottom };
}

/** Breaks a lane into [from, to] stretches of nodes that fit; the end node of one begins the next. */
function breakRows(lane: Lane, spacing: LaneSpacing, width: number): [number, number][] {
  const last = lane.nodes.length - 1;
  const isFirm = (index: number) =>
    lane.partners.some((partner) => partner.from < index && index < partner.to);
  const rows: [number, number][] = [];
  let from = 0;
  let reached = 0;
  for (let index = 1; index <= last; index++) {
    if (isFirm(index)) continue;
    if (naturalWidth(spacing, from, index) > width && reached > from) {
      rows.push([from, reached]);
      from = reached;
    }
    reached = index;
  }
  rows.push([from, last]);
  return rows;
}

function naturalWidth(spacing: LaneSpacing, from: number, to: number): number {
  let width = 0;
  for (let index = from; index < to; index++) width += spacing.zones[index] + spacing.gaps[index];
  return width;
}

/** Draws a supply left to right: columns hang down, branches run along lanes above. */
export function drawSupply(
  lane: Lane,
  sheet: Sheet,
  rails: ReadonlySet<string>,
  isBranch = false,
): Figure {
  const spacing = spaceLane(lane, sheet);
  const row = drawRow({
    ...{ lane, spacing, sheet, rails, from: 0, to: lane.nodes.length - 1, stretch: 0 },
    hasFirstNode: !isBranch,
    hasLastNode: true,
  });
  const sketch = row.sketch;
  let top = row.top;
  const ordered = [...lane.branches].sort(
    (a, b) => Number(b.isFeeding) - Number(a.isFeeding) || b.at - a.at,
  );
  for (const branch of ordered) {
    const figure = drawSupply(branch.lane, sheet, rails, true);
    const x = branchStart(row, branch.at, branch.isFeeding);
    const y = -(top + CLEARANCE + figure.bottom);
    const placed = branch.isFeeding ? mirrored(figure.sketch, 0) : figure.sketch;
    addSketch(sketch, moved(placed, x, y));
    sketch.wires.push({
      node: lane.nodes[branch.at],
      spots: [
        { x, y: 0 },
        { x, y },
      ],
    });
    top = -y + figure.top;
  }
  return { sketch, top, bottom: row.bottom };
}

function branchStart(row: Row, at: number, isFeeding: boolean): number {
  return (isFeeding ? row.starts : row.ends).get(at) ?? 0;
}
