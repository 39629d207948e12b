import { type Netlist, type Placement } from '@engine/netlist/types';
import { doCrossAny } from './boxes';
import { railSymbol } from './draw-column';
import { type DrawnPart, type Drawing, emptySketch, type Sketch, type Spot } from './drawing';
import { finish } from './finish';
import { addNodeLabels } from './free-labels';
import { railsIn } from '@/lib/bench/graph';
import { drawPart } from './metrics';

const ROW_PITCH = 140;
const SHELF_PITCH = 160;
const TAIL = 10;
/** Straight piece at each terminal before a wire may bend, px. */
const STUB = 12;
const DETOUR = 60;

interface Terminal {
  spot: Spot;
  /** End of the straight piece that leads away from the symbol. */
  out: Spot;
}

/** True when somebody has placed at least one part by hand. */
export function isPlaced(netlist: Netlist): boolean {
  return netlist.parts.some((part) => netlist.layout?.[part.ref]);
}

/**
 * Draws a circuit whose parts were placed by hand: `x`, `y` are the centre of a symbol.
 *
 * Parts without a place stand in a row below the others. Wires bend once, on the side that is free.
 *
 * @param netlist circuit with a layout for at least one part.
 */
export function layoutAsPlaced(netlist: Netlist): Drawing {
  const sketch = emptySketch();
  const layout = netlist.layout ?? {};
  const placed = Object.values(layout);
  const shelfY = Math.max(0, ...placed.map(({ y }) => y)) + SHELF_PITCH;
  const shelfX = placed.length > 0 ? Math.min(...placed.map(({ x }) => x)) : 0;
  let shelved = 0;
  for (const part of netlist.parts) {
    const place: Placement = layout[part.ref] ?? {
      x: shelfX + shelved++ * ROW_PITCH,
      y: shelfY,
      turn: 0,
    };
    sketch.parts.push(drawPart(part, place.x, place.y, place.turn));
  }
  const rails = railsIn(netlist);
  const terminals = terminalsByNode(sketch.parts);
  for (const [node, spots] of terminals) {
    if (rails.has(node)) spots.forEach((at) => addRail(sketch, node, at, rails, netlist));
    else addWires(sketch, node, spots);
  }
  addNodeLabels(
    sketch,
    netlist,
    [...terminals.keys()].filter((node) => !rails.has(node)),
  );
  return finish(sketch);
}

function terminalsByNode(parts: readonly DrawnPart[]): Map<string, Terminal[]> {
  const byNode = new Map<string, Terminal[]>();
  for (const { part, terminals, x, y } of parts) {
    part.between.forEach((node, end) => {
      const spot = terminals[end];
      const out = {
        x: spot.x + Math.sign(Math.round(spot.x - x)) * STUB,
        y: spot.y + Math.sign(Math.round(spot.y - y)) * STUB,
      };
      byNode.set(node, [...(byNode.get(node) ?? []), { spot, out }]);
    });
  }
  return byNode;
}

function addRail(
  sketch: Sketch,
  node: string,
  { spot, out }: Terminal,
  rails: ReadonlySet<string>,
  netlist: Netlist,
): void {
  const end = { x: out.x, y: out.y + TAIL };
  sketch.wires.push({ node, spots: [spot, out, end] });
  const isNamed = node !== netlist.reference;
  sketch.rails.push(railSymbol(node, end, rails, isNamed, netlist.reference));
}

/** Joins terminals to their nearest joined neighbour, one after the other. */
function addWires(sketch: Sketch, node: string, terminals: readonly Terminal[]): void {
  if (terminals.length > 1) {
    terminals.forEach(({ spot, out }) => sketch.wires.push({ node, spots: [spot, out] }));
  }
  const joined = [terminals[0].out];
  const waiting = terminals.slice(1).map(({ out }) => out);
  while (waiting.length > 0) {
    let best = { from: joined[0], to: waiting[0], length: Infinity };
    for (const from of joined) {
      for (const to of waiting) {
        const length = Math.abs(from.x - to.x) + Math.abs(from.y - to.y);
        if (length < best.length) best = { from, to, length };
      }
    }
    waiting.splice(waiting.indexOf(best.to), 1);
    joined.push(best.to);
    if (best.length > 0) sketch.wires.push({ node, spots: bend(sketch, best.from, best.to) });
  }
}

/** The way between two spots that runs over the fewest symbols and labels; shorter ones first. */
function bend(sketch: Sketch, from: Spot, to: Spot): Spot[] {
  const level = (y: number) => [from, { x: from.x, y }, { x: to.x, y }, to];
  const upright = (x: number) => [from, { x, y: from.y }, { x, y: to.y }, to];
  const ways = [
    upright(to.x),
    level(to.y),
    upright((from.x + to.x) / 2),
    level((from.y + to.y) / 2),
    level(Math.max(from.y, to.y) + DETOUR),
    level(Math.min(from.y, to.y) - 1.5 * DETOUR),
    upright(Math.max(from.x, to.x) + DETOUR),
    upright(Math.min(from.x, to.x) - DETOUR),
  ];
  const crossings = (way: Spot[]) =>
    sketch.parts.filter(({ box, label }) => doCrossAny(way, box) || doCrossAny(way, label.box))
      .length;
  return ways.reduce((best, way) => (crossings(way) < crossings(best) ? way : best));
}
