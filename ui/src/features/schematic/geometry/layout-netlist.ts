import { type Netlist } from '@engine/netlist/types';
import { type Block, blocksOf } from './blocks';
import { addSketch, type Drawing, emptySketch } from './drawing';
import { drawString, drawSupply, type Figure } from './draw-lane';
import { finish } from './finish';
import { type Lane, laneOf } from './lane';
import { CLEARANCE } from './metrics';
import { findOverlaps } from './overlaps';
import { moved } from './place-sketch';

const FIGURE_GAP = 3 * CLEARANCE;

/**
 * Lays a circuit out as a technician would draw it: strings wrapped into rows, supplies left to right.
 *
 * @param netlist checked circuit.
 * @param width room for a string's rows, px.
 * @returns the drawing, or null when a figure is neither a string nor a supply, or labels would collide.
 */
export function layoutNetlist(netlist: Netlist, width: number): Drawing | null {
  if (netlist.parts.length === 0) return finish(emptySketch());
  const sketch = emptySketch();
  let y = 0;
  let hasSource = false;
  for (const block of blocksOf(netlist)) {
    const lane = laneOf({ ...block, isString: block.kind === 'string' });
    if (!lane) return null;
    hasSource = addStart(lane, block, netlist, hasSource);
    const sheet = { netlist, line: netlist.line };
    const figure: Figure =
      block.kind === 'string'
        ? drawString(lane, sheet, block.rails, width)
        : drawSupply(lane, sheet, block.rails);
    y += figure.top;
    addSketch(sketch, moved(figure.sketch, 0, y));
    y += figure.bottom + FIGURE_GAP;
  }
  const drawing = finish(sketch);
  return findOverlaps(drawing).length === 0 ? drawing : null;
}

/** Puts the line's symbol at the start of the first figure it feeds, a named flag at the others. */
function addStart(lane: Lane, block: Block, netlist: Netlist, hasSource: boolean): boolean {
  const { line } = netlist;
  if (!line || block.start !== line.hot || hasSource) return hasSource;
  const drop = lane.drops.get(0) ?? { node: block.start, columns: [] };
  drop.columns.unshift({ parts: [], nodes: [line.hot, line.return] });
  lane.drops.set(0, drop);
  return true;
}
