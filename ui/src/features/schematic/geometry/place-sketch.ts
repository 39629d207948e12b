import { type Anchor, type Box, type Sketch, type Spot, type TextPlace } from './drawing';

const OTHER_SIDE = { below: 'below', left: 'right', right: 'left' } as const;
const OPPOSITE: Record<Anchor, Anchor> = { start: 'end', middle: 'middle', end: 'start' };

/** Moves a sketch without changing it. */
export function moved(sketch: Sketch, dx: number, dy: number): Sketch {
  return changed(
    sketch,
    (spot) => ({ x: spot.x + dx, y: spot.y + dy }),
    (box) => ({ ...box, x: box.x + dx, y: box.y + dy }),
    false,
  );
}

/** Mirrors a sketch left to right about an upright axis; text stays readable. */
export function mirrored(sketch: Sketch, axis: number): Sketch {
  return changed(
    sketch,
    (spot) => ({ x: 2 * axis - spot.x, y: spot.y }),
    (box) => ({ ...box, x: 2 * axis - box.x - box.width }),
    true,
  );
}

function changed(
  sketch: Sketch,
  spot: (spot: Spot) => Spot,
  box: (box: Box) => Box,
  isMirrored: boolean,
): Sketch {
  const text = (place: TextPlace): TextPlace => ({
    box: box(place.box),
    anchor: isMirrored ? OPPOSITE[place.anchor] : place.anchor,
  });
  return {
    parts: sketch.parts.map((drawn) => ({
      ...drawn,
      ...spot(drawn),
      turn: isMirrored && drawn.turn === 0 ? 2 : isMirrored && drawn.turn === 2 ? 0 : drawn.turn,
      terminals: [spot(drawn.terminals[0]), spot(drawn.terminals[1])],
      box: box(drawn.box),
      label: text(drawn.label),
    })),
    wires: sketch.wires.map((wire) => ({ ...wire, spots: wire.spots.map(spot) })),
    nodes: sketch.nodes.map((node) => ({
      ...node,
      spot: spot(node.spot),
      label: text(node.label),
    })),
    rails: sketch.rails.map((rail) => ({
      ...rail,
      side: isMirrored ? OTHER_SIDE[rail.side] : rail.side,
      spot: spot(rail.spot),
      box: box(rail.box),
    })),
    sources: sketch.sources.map((source) => ({
      ...source,
      ...spot(source),
      box: box(source.box),
      label: text(source.label),
    })),
  };
}
