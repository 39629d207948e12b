import { type Anchor, type Box, type Spot, type TextPlace } from './drawing';

/**
 * Makes the smallest box around some boxes.
 *
 * @param boxes at least one; an empty list gives an empty box at the origin.
 */
export function unionOf(boxes: readonly Box[]): Box {
  if (boxes.length === 0) return { x: 0, y: 0, width: 0, height: 0 };
  const x = Math.min(...boxes.map((box) => box.x));
  const y = Math.min(...boxes.map((box) => box.y));
  const right = Math.max(...boxes.map((box) => box.x + box.width));
  const bottom = Math.max(...boxes.map((box) => box.y + box.height));
  return { x, y, width: right - x, height: bottom - y };
}

/** Grows a box by the same margin on all sides. */
export function grown(box: Box, margin: number): Box {
  return {
    x: box.x - margin,
    y: box.y - margin,
    width: box.width + 2 * margin,
    height: box.height + 2 * margin,
  };
}

/** True when two boxes share area; touching edges do not count. */
export function doOverlap(a: Box, b: Box, slack = 0.5): boolean {
  return (
    a.x + slack < b.x + b.width &&
    b.x + slack < a.x + a.width &&
    a.y + slack < b.y + b.height &&
    b.y + slack < a.y + a.height
  );
}

/** Box of an upright or level piece of wire, without thickness. */
export function boxOfSegment(from: Spot, to: Spot): Box {
  return {
    x: Math.min(from.x, to.x),
    y: Math.min(from.y, to.y),
    width: Math.abs(from.x - to.x),
    height: Math.abs(from.y - to.y),
  };
}

/** True when a straight, level or upright piece of wire runs through the inside of a box. */
export function doesCross(from: Spot, to: Spot, box: Box, slack = 1): boolean {
  const inner = grown(box, -slack);
  const wire = boxOfSegment(from, to);
  return (
    wire.x <= inner.x + inner.width &&
    inner.x <= wire.x + wire.width &&
    wire.y <= inner.y + inner.height &&
    inner.y <= wire.y + wire.height
  );
}

/**
 * Keeps room for text beside a spot.
 *
 * @param x where the anchor stands.
 * @param y top of the text.
 */
export function textPlace(
  x: number,
  y: number,
  width: number,
  height: number,
  anchor: Anchor,
): TextPlace {
  const shift = anchor === 'start' ? 0 : anchor === 'middle' ? width / 2 : width;
  return { box: { x: x - shift, y, width, height }, anchor };
}

/** True when any piece of a bent wire runs through the inside of a box. */
export function doCrossAny(spots: readonly Spot[], box: Box): boolean {
  return spots.slice(1).some((to, index) => doesCross(spots[index], to, box));
}
