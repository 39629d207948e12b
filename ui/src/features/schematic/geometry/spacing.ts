import { type Line, type Netlist, type Part } from '@engine/netlist/types';
import { type Column, type Drop, type Lane } from './lane';
import {
  CLEARANCE,
  LABEL_GAP,
  lineLabel,
  nodeLabelWidth,
  partLabelWidth,
  SYMBOL_HALF,
  SYMBOL_LENGTH,
  textWidth,
} from './metrics';

/** Facts about the circuit that widths depend on. */
export interface Sheet {
  netlist: Pick<Netlist, 'points' | 'reference'>;
  line?: Line;
}

/** Where the columns below one spot stand, px from the spot. */
export interface DropSpacing {
  offsets: number[];
  /** From the last column to the right end of its labels. */
  reach: number;
}

/** Widths along a lane. */
export interface LaneSpacing {
  drops: Map<number, DropSpacing>;
  cathodes: Map<number, DropSpacing>;
  /** Width taken by the columns of each node, 0 for one or none. */
  zones: number[];
  /** From the end of each node's zone to the next node. */
  gaps: number[];
  /** From the end of each node's zone to the centre of the part behind it. */
  centres: number[];
}

const SOURCE_HALF = 18;
/** Shortest lead between a symbol and a node, px. */
const LEAD = 14;

/** Half width of a column's widest symbol. */
function halfOf(column: Column): number {
  return Math.max(SOURCE_HALF, ...column.parts.map((part) => SYMBOL_HALF[part.kind]));
}

/** From a column's axis to the right end of its labels. */
function reachOf(column: Column, sheet: Sheet): number {
  const widths = column.parts.map((part) => SYMBOL_HALF[part.kind] + partLabelWidth(part));
  const inner = column.nodes.slice(1, -1).map((node) => nodeLabelWidth(sheet.netlist, node));
  if (column.parts.length === 0 && sheet.line) {
    widths.push(SOURCE_HALF + Math.max(...lineLabel(sheet.line).map(textWidth)));
  }
  return Math.max(0, ...widths, ...inner) + LABEL_GAP;
}

function spaceDrop(drop: Drop, sheet: Sheet): DropSpacing {
  const offsets = [0];
  const label = nodeLabelWidth(sheet.netlist, drop.node) + 2 * LABEL_GAP;
  drop.columns.slice(1).forEach((column, index) => {
    const before = drop.columns[index];
    const pitch = reachOf(before, sheet) + CLEARANCE + halfOf(column);
    offsets.push(offsets[index] + Math.max(pitch, index === 0 ? label : 0));
  });
  const last = drop.columns[drop.columns.length - 1];
  const reach = reachOf(last, sheet);
  return { offsets, reach: Math.max(reach, drop.columns.length === 1 ? label : 0) };
}

/**
 * Finds how wide each stretch of a lane must be so that no label meets a symbol, a wire or another label.
 *
 * @param lane ordered figure.
 * @param sheet labels of points and the line.
 * @returns widths in px; they may be stretched, never shrunk.
 */
export function spaceLane(lane: Lane, sheet: Sheet): LaneSpacing {
  const drops = mapValues(lane.drops, (drop) => spaceDrop(drop, sheet));
  const cathodes = mapValues(lane.cathodes, (drop) => spaceDrop(drop, sheet));
  const zones = lane.nodes.map((_, index) => drops.get(index)?.offsets.at(-1) ?? 0);

  const rightOf = (index: number) =>
    drops.get(index)?.reach ?? nodeLabelWidth(sheet.netlist, lane.nodes[index]) / 2;
  const leftOf = (index: number) => {
    const drop = lane.drops.get(index);
    if (drop) return halfOf(drop.columns[0]);
    return nodeLabelWidth(sheet.netlist, lane.nodes[index]) / 2;
  };
  const sides = lane.parts.map((part, index) => {
    const cathode = lane.cathodes.get(index);
    const spacing = cathodes.get(index);
    const half = slotWidth(part) / 2;
    if (!cathode || !spacing) {
      const missing = rightOf(index) + CLEARANCE + leftOf(index + 1) - 2 * half;
      return [half + Math.max(0, missing / 2), half + Math.max(0, missing / 2)];
    }
    const before = rightOf(index) + CLEARANCE + halfOf(cathode.columns[0]);
    const after = spacing.offsets.at(-1)! + spacing.reach + CLEARANCE + leftOf(index + 1);
    return [Math.max(half, before), Math.max(half, after)];
  });
  const gaps = sides.map(([before, after]) => before + after);
  widenForPartners(lane, sheet, zones, gaps);
  const centres = sides.map(
    ([before, after], index) => before + (gaps[index] - before - after) / 2,
  );
  return { drops, cathodes, zones, gaps, centres };
}

/** Width of one part lying along a line with its label above and a lead on either side. */
export function slotWidth(part: Part): number {
  return Math.max(SYMBOL_LENGTH + 2 * LEAD, partLabelWidth(part) + CLEARANCE);
}

/** Width that the parts of a partner need side by side. */
export function partnerWidth(parts: Part[], nodes: string[], sheet: Sheet): number {
  const inner = nodes.slice(1, -1).map((node) => nodeLabelWidth(sheet.netlist, node) + CLEARANCE);
  return [...parts.map(slotWidth), ...inner].reduce((sum, width) => sum + width, 0);
}

function widenForPartners(lane: Lane, sheet: Sheet, zones: number[], gaps: number[]): void {
  for (const { from, to, parts, nodes } of lane.partners) {
    let room = 0;
    for (let index = from; index < to; index++) {
      room += gaps[index] + (index > from ? zones[index] : 0);
    }
    const missing = partnerWidth(parts, nodes, sheet) - room;
    if (missing > 0) {
      for (let index = from; index < to; index++) gaps[index] += missing / (to - from);
    }
  }
}

function mapValues<V, W>(map: Map<number, V>, change: (value: V) => W): Map<number, W> {
  return new Map([...map].map(([key, value]) => [key, change(value)]));
}
