import { type Part, type Placement } from '@engine/netlist/types';

/** A spot on the sheet, in px; x to the right, y down. */
export interface Spot {
  x: number;
  y: number;
}

/** An upright rectangle on the sheet, in px. */
export interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

export type Turn = Placement['turn'];
export type Anchor = 'start' | 'middle' | 'end';

/** Room kept for text: the lines stand inside the box, aligned by the anchor. */
export interface TextPlace {
  box: Box;
  anchor: Anchor;
}

/** A part on the sheet. */
export interface DrawnPart {
  part: Part;
  /** Centre of the symbol. */
  x: number;
  y: number;
  /** Quarter turns clockwise; 2 is mirrored left to right, so that a tube never hangs upside down. */
  turn: Turn;
  /** Where the first and the second node of `between` meet the symbol. */
  terminals: [Spot, Spot];
  /** Extent of the symbol without its label. */
  box: Box;
  label: TextPlace;
}

/** One straight or bent piece of wire of one node. */
export interface Wire {
  node: string;
  spots: Spot[];
}

/** A node's label, its values and the spot on the wire they belong to. */
export interface DrawnNode {
  node: string;
  spot: Spot;
  label: TextPlace;
}

/** End of a wire on the reference, or on a rail that is drawn elsewhere. */
export interface RailSymbol {
  node: string;
  kind: 'reference' | 'flag' | 'loose';
  /** Where the symbol lies seen from its wire; a flag beside the wire begins a figure. */
  side: 'below' | 'left' | 'right';
  spot: Spot;
  /** Extent with its name, if it carries one. */
  box: Box;
  isNamed: boolean;
}

/** The AC line, drawn upright. */
export interface SourceSymbol {
  x: number;
  y: number;
  box: Box;
  label: TextPlace;
}

/** A circuit on the sheet; pure data for React to draw. */
export interface Drawing {
  parts: DrawnPart[];
  wires: Wire[];
  /** Spots where three or more wires of one node meet. */
  dots: { node: string; spot: Spot }[];
  nodes: DrawnNode[];
  rails: RailSymbol[];
  sources: SourceSymbol[];
  /** Dashed outlines around the sections of one body. */
  assemblies: { name: string; box: Box }[];
  extent: Box;
}

/** A drawing while it is put together. */
export type Sketch = Omit<Drawing, 'dots' | 'assemblies' | 'extent'>;

/** Starts an empty sketch. */
export function emptySketch(): Sketch {
  return { parts: [], wires: [], nodes: [], rails: [], sources: [] };
}

/** Adds everything of one sketch to another. */
export function addSketch(target: Sketch, source: Sketch): void {
  target.parts.push(...source.parts);
  target.wires.push(...source.wires);
  target.nodes.push(...source.nodes);
  target.rails.push(...source.rails);
  target.sources.push(...source.sources);
}
