import { type Line, type Netlist, type Part, type PartKind } from '@engine/netlist/types';
import { partValue } from '@/lib/bench/part-words';
import { labelForNode } from '@/lib/bench/places';
import { type Box, type DrawnPart, type Spot, type Turn } from './drawing';
import { textPlace } from './boxes';

/** Distance between the two terminals of every symbol, px. */
export const SYMBOL_LENGTH = 60;
/** Height of one line of text on the sheet, px. */
export const LINE_HEIGHT = 15;
/** Room between a symbol and its label, px. */
export const LABEL_GAP = 10;
/** Room kept between things that must not touch, px. */
export const CLEARANCE = 12;
/** Room that a value such as "≈ 118.4 V" may need beside a node, px. */
export const VALUE_WIDTH = 78;
/** Room for a value at a node that is no point of the circuit, where values are rare, px. */
const SIDE_VALUE_WIDTH = 54;
/** Room that a suspect's badge may need, px. */
export const BADGE_WIDTH = 66;
/** Lines of a part's label: badge, designator, value. */
export const PART_LABEL_HEIGHT = 3 * LINE_HEIGHT;
/** Lines of a node's label: name, measured, computed. */
export const NODE_LABEL_HEIGHT = 3 * LINE_HEIGHT;
/** Height of a reference symbol, px. */
export const RAIL_HEIGHT = 20;

const CHARACTER_WIDTH = 7;

/** How far each symbol reaches to either side of its axis, px. */
export const SYMBOL_HALF: Record<PartKind, number> = {
  resistor: 10,
  heater: 24,
  lamp: 16,
  thermistor: 16,
  switch: 16,
  fuse: 8,
  joint: 8,
  capacitor: 16,
  rectifier: 18,
  choke: 12,
  winding: 14,
  load: 16,
};

/** Estimates how wide a text stands on the sheet, px; on the wide side. */
export function textWidth(text: string): number {
  return Math.ceil(text.length * CHARACTER_WIDTH);
}

/** Width kept for a part's label, px. */
export function partLabelWidth(part: Part): number {
  return Math.max(BADGE_WIDTH, textWidth(part.ref), textWidth(partValue(part)));
}

/** Width kept for a node's label and values, px. */
export function nodeLabelWidth(netlist: Pick<Netlist, 'points'>, node: string): number {
  const isPoint = netlist.points?.some((point) => point.node === node);
  if (!isPoint) return Math.max(SIDE_VALUE_WIDTH, textWidth(node));
  return Math.max(VALUE_WIDTH, textWidth(labelForNode(netlist, node)));
}

/** The two lines beside the line's symbol. */
export function lineLabel(line: Line): [string, string] {
  return ['Line', `${line.volts} V, ${line.hertz} Hz`];
}

/**
 * Finds where the two terminals of a symbol lie.
 *
 * @param x centre of the symbol.
 * @param y centre of the symbol.
 * @param turn quarter turns clockwise.
 * @returns terminals of the first and the second node.
 */
export function terminalsAt(x: number, y: number, turn: Turn): [Spot, Spot] {
  const half = SYMBOL_LENGTH / 2;
  const [dx, dy] = [
    [-half, 0],
    [0, -half],
    [half, 0],
    [0, half],
  ][turn];
  return [
    { x: x + dx, y: y + dy },
    { x: x - dx, y: y - dy },
  ];
}

/** Extent of a symbol without its label. */
export function symbolBox(kind: PartKind, x: number, y: number, turn: Turn): Box {
  const half = SYMBOL_HALF[kind];
  const isLevel = turn % 2 === 0;
  const width = isLevel ? SYMBOL_LENGTH : 2 * half;
  const height = isLevel ? 2 * half : SYMBOL_LENGTH;
  return { x: x - width / 2, y: y - height / 2, width, height };
}

/** Puts a part on the sheet: its label above when it lies level, to the right when it stands. */
export function drawPart(part: Part, x: number, y: number, turn: Turn): DrawnPart {
  const half = SYMBOL_HALF[part.kind];
  const width = partLabelWidth(part);
  const label =
    turn % 2 === 0
      ? textPlace(x, y - half - LABEL_GAP - PART_LABEL_HEIGHT, width, PART_LABEL_HEIGHT, 'middle')
      : textPlace(
          x + half + LABEL_GAP,
          y - PART_LABEL_HEIGHT / 2,
          width,
          PART_LABEL_HEIGHT,
          'start',
        );
  return {
    part,
    x,
    y,
    turn,
    terminals: terminalsAt(x, y, turn),
    box: symbolBox(part.kind, x, y, turn),
    label,
  };
}
