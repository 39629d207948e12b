/**
 * The netlist document and what a bench adds to it: the parts of one circuit, how a set differs from
 * its family (as found), and the readings taken on it. All values are SI numbers.
 */

/** Every kind of part the engine can solve. */
export const PART_KINDS = [
  'resistor',
  'heater',
  'lamp',
  'thermistor',
  'switch',
  'fuse',
  'joint',
  'capacitor',
  'rectifier',
  'choke',
  'winding',
  'load',
] as const;
export type PartKind = (typeof PART_KINDS)[number];

export type ResistorMake = 'composition' | 'film' | 'wirewound';
export type CapacitorMake = 'electrolytic' | 'paper' | 'film' | 'ceramic' | 'mica';
export type RectifierMake = 'vacuum' | 'selenium' | 'silicon';

interface PartBase {
  /** Reference designator, unique in the circuit: letters, digits, `-`, `_`, 1 to 24 characters. */
  ref: string;
  /** The two nodes the part lies between; for a rectifier anode first, then cathode. */
  between: [string, string];
  /** Body this section belongs to: a tapped dropper, a multi-section can, a tapped heater. */
  assembly?: string;
  /** Fraction of the nominal value, 0.1 for ±10 %. */
  tolerance?: number;
  note?: string;
}

export interface ResistorPart extends PartBase {
  kind: 'resistor';
  ohms: number;
  watts?: number;
  make?: ResistorMake;
}
export interface HeaterPart extends PartBase {
  kind: 'heater';
  volts: number;
  amps: number;
  tube?: string;
  /** Node of the tube's cathode, where a heater-cathode leak ends. */
  cathode?: string;
  coldRatio?: number;
  exponent?: number;
}
export interface LampPart extends PartBase {
  kind: 'lamp';
  volts: number;
  amps: number;
  /** Type number of the lamp. */
  lamp?: string;
  coldRatio?: number;
  exponent?: number;
}
export interface ThermistorPart extends PartBase {
  kind: 'thermistor';
  hotOhms: number;
  coldOhms: number;
  /** Current at which it has `hotOhms`. */
  amps: number;
  exponent?: number;
}
export interface ContactPart extends PartBase {
  kind: 'switch' | 'fuse' | 'joint';
  ohms?: number;
}
export interface CapacitorPart extends PartBase {
  kind: 'capacitor';
  farads: number;
  /** Rated voltage. */
  volts?: number;
  make?: CapacitorMake;
  esr?: number;
}
export interface RectifierPart extends PartBase {
  kind: 'rectifier';
  make?: RectifierMake;
  dropVolts?: number;
  ohms?: number;
}
export interface ChokePart extends PartBase {
  kind: 'choke';
  henries: number;
  ohms: number;
}
export interface WindingPart extends PartBase {
  kind: 'winding';
  /** RMS volts of the unloaded secondary. */
  volts: number;
  ohms: number;
  phase?: 0 | 180;
}
export interface LoadPart extends PartBase {
  kind: 'load';
  amps: number;
  volts: number;
  exponent?: number;
}

export type Part =
  | ResistorPart
  | HeaterPart
  | LampPart
  | ThermistorPart
  | ContactPart
  | CapacitorPart
  | RectifierPart
  | ChokePart
  | WindingPart
  | LoadPart;

export interface Line {
  hot: string;
  return: string;
  /** Design RMS voltage; a case gives the one measured that day. */
  volts: number;
  hertz: number;
  /** Source resistance, 0 when left out. */
  ohms?: number;
}

export interface Published {
  acVolts?: number;
  dcVolts?: number;
  rippleVolts?: number;
  ohms?: number;
}

/** A place for a lead. */
export interface Point {
  node: string;
  label: string;
  published?: Published;
}

export interface Placement {
  x: number;
  y: number;
  /** Quarter turns, clockwise. */
  turn: 0 | 1 | 2 | 3;
}

export interface Netlist {
  ohmstead: 1;
  title: string;
  /** Node that readings are taken against unless they say otherwise. */
  reference: string;
  line?: Line;
  parts: Part[];
  points?: Point[];
  layout?: Record<string, Placement>;
}

/** One difference between the family's drawing and this set. It is certain, never a suspect as such. */
export type AsFound =
  | ({ part: string; change: 'fitted' | 'value' } & Record<string, unknown>)
  | { part: string; change: 'bridged' | 'missing' }
  | { change: 'added'; add: Part };

export const TAKES = [
  'ac-volts',
  'dc-volts',
  'ripple-volts',
  'amps',
  'ohms',
  'lifted-ohms',
  'sign',
] as const;
export type Take = (typeof TAKES)[number];

/** What a person can see or hear on a part. */
export const SEEN = [
  'dark',
  'glows',
  'burnt',
  'cracked',
  'bulging',
  'leaking',
  'hums',
  'cold',
  'warm',
  'hot',
  'looks-good',
] as const;
export type Seen = (typeof SEEN)[number];

/** The meter a reading was taken with. Left out, it is a 10 MΩ digital meter of 4000 counts. */
export interface Meter {
  /** Input resistance on volts. */
  ohms?: number;
  /** Moving-coil: input resistance is `ohmsPerVolt` × `fullScale`. */
  ohmsPerVolt?: number;
  fullScale?: number;
  /** Accuracy as a fraction of the reading. */
  ofReading?: number;
  /** Accuracy as a fraction of full scale (moving-coil). */
  ofFullScale?: number;
  /** Accuracy in counts of the last digit. */
  digits?: number;
  /** Value of the last digit on the range used. */
  resolution?: number;
  /** Above this the ohms range shows OL. Default 20 MΩ. */
  overOhms?: number;
}

export interface Reading {
  take: Take;
  /** [red lead, black lead]. */
  at?: [string, string];
  part?: string;
  value?: number | 'OL';
  seen?: Seen;
  meter?: Meter;
}

export interface Conditions {
  /** Line voltage measured that day; the design value when left out. */
  lineVolts?: number;
}

/** Fault modes by the word used in readings, rules and reports. */
export const FAULT_MODES = [
  'open',
  'high',
  'low',
  'bridged',
  'shorted',
  'wrong-type',
  'heater-cathode-leak',
  'poor-contact',
  'leaky',
  'high-esr',
  'weak',
  'shorted-turns',
  'overload',
  'no-load',
] as const;
export type FaultMode = (typeof FAULT_MODES)[number];

/** One problem of a document, naming the part or node and the field it belongs to. */
export interface NetlistProblem {
  /** Fixed code, for programs and tests. */
  code: string;
  /** A full sentence for a person: what is wrong and what to do. */
  message: string;
  part?: string;
  nodes?: string[];
  /** JSON pointer into the document, such as `/parts/3/ohms`. */
  path?: string;
}
