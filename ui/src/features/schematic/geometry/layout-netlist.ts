import { type Netlist } from '@engine/netlist/types';
import { type Block, blocksOf } from './blocks';
import { addSketch, type Drawing, emptySketch, type Sketch } from './drawing';
import { drawString, drawSupply, type Figure } from './draw-lane';
import { boundsOf, finish } from './finish';
import { type Lane, laneOf } from './lane';
import { CLEARANCE } from './metrics';
import { moved } from './place-sketch';

const FIGURE_GAP = 3 * CLEARANCE;

/**
 * Lays a circuit out as a technician would draw it: strings wrapped into rows, supplies left to right.
 *
 * @param netlist checked circuit.
 * @param width room for a string's rows, px.
 * @returns the drawing, or null when a figure is neither a string nor a supply.
 */
export function layoutNetlist(netlist: Netlist, width: number): Drawing | null {
  if (netlist.parts.length === 0) return finish(emptySketch());
  const figures: Figure[] = [];
  let hasSource = false;
  for (const block of blocksOf(netlist)) {
    const lane = laneOf({ ...block, isString: block.kind === 'string' });
    if (!lane) return null;
    hasSource = addStart(lane, block, netlist, hasSource);
    const sheet = { netlist, line: netlist.line };
    figures.push(
      block.kind === 'string'
        ? drawString(lane, sheet, block.rails, width)
        : drawSupply(lane, sheet, block.rails),
    );
  }
  const sketch = onShelves(figures, width);
  return finish(sketch);
}

/** Puts figures side by side as long as they fit, their lines on one level; the next ones go below. */
function onShelves(figures: readonly Figure[], width: number): Sketch {
  const sketch = emptySketch();
  let shelf: { figure: Figure; x: number }[] = [];
  let x = 0;
  let y = 0;
  const close = () => {
    const top = Math.max(0, ...shelf.map(({ figure }) => figure.top));
    shelf.forEach((placed) => addSketch(sketch, moved(placed.figure.sketch, placed.x, y + top)));
    y += top + Math.max(0, ...shelf.map(({ figure }) => figure.bottom)) + FIGURE_GAP;
    shelf = [];
    x = 0;
  };
  for (const figure of figures) {
    const bounds = boundsOf(figure.sketch);
    if (x > 0 && x + bounds.width > width) close();
    shelf.push({ figure, x: x - bounds.x });
    x += bounds.width + FIGURE_GAP;
  }
  close();
  return sketch;
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
