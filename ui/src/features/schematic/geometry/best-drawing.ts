import { type Netlist } from '@engine/netlist/types';
import { type Box, type Drawing } from './drawing';
import { layoutNetlist } from './layout-netlist';
import { findOverlaps } from './overlaps';
import { isPlaced, layoutAsPlaced } from './placed-layout';

/** Below this scale the text of a drawing is too small to read. */
const LEGIBLE = 0.72;
const LARGEST = 1.3;
const WIDTHS = [360, 520, 700, 900, 1150, 1450, 1800];

/**
 * Draws a circuit so that it stands as large as it can in the room there is.
 *
 * @param netlist checked circuit; a layout made by hand wins.
 * @param room px on the screen.
 * @returns the drawing, free of overlaps unless placed by hand; null when the circuit needs the general
 *   layout.
 */
export function bestDrawing(
  netlist: Netlist,
  room: { width: number; height: number },
): Drawing | null {
  if (isPlaced(netlist)) return layoutAsPlaced(netlist);
  let best: { drawing: Drawing; scale: number } | null = null;
  let widest: { drawing: Drawing; scale: number } | null = null;
  for (const width of WIDTHS) {
    const drawing = layoutNetlist(netlist, width);
    if (!drawing) return null;
    const { extent } = drawing;
    const scale = Math.min(room.width / extent.width, room.height / extent.height);
    if (!best || scale > best.scale * 1.02) best = { drawing, scale };
    const across = Math.min(1, room.width / extent.width);
    if (!widest || across >= widest.scale) widest = { drawing, scale: across };
    if (extent.width < width * 0.7) break;
  }
  // Too long to be read whole: fill the width, and the rest is a matter of panning.
  const chosen = best && best.scale < LEGIBLE ? widest : best;
  // Labels that collide are the sign of a form that was not foreseen.
  return chosen && findOverlaps(chosen.drawing).length === 0 ? chosen.drawing : null;
}

/** Where a drawing stands on the screen: px of its origin, and its scale. */
export interface View {
  x: number;
  y: number;
  zoom: number;
}

/**
 * Chooses how a drawing is first shown: whole when it can be read so, else from its top left.
 *
 * @param extent extent of the drawing.
 * @param room px on the screen.
 */
export function firstView(extent: Box, room: { width: number; height: number }): View {
  const whole = wholeView(extent, room);
  if (whole.zoom >= LEGIBLE) return whole;
  const zoom = Math.min(1, Math.max(LEGIBLE, room.width / extent.width));
  const spare = Math.max(0, room.width - extent.width * zoom) / 2;
  const above = Math.max(0, room.height - extent.height * zoom) / 2;
  return { x: spare - extent.x * zoom, y: above - extent.y * zoom, zoom };
}

/** The whole drawing in the middle of the room. */
export function wholeView(extent: Box, room: { width: number; height: number }): View {
  const zoom = Math.min(LARGEST, room.width / extent.width, room.height / extent.height);
  return {
    x: (room.width - extent.width * zoom) / 2 - extent.x * zoom,
    y: (room.height - extent.height * zoom) / 2 - extent.y * zoom,
    zoom,
  };
}
