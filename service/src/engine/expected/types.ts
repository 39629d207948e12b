import type { Reading } from '../netlist/types';

/** One resistance of the network at its operating point. */
export interface NodalConductance {
  /** Part it stands for. */
  part: string;
  a: string;
  b: string;
  siemens: number;
  /** What a person should know about it, such as that it is a hot part's resistance at this current. */
  note?: string;
}

/** A linear network at its operating point. */
export interface NodalSystem {
  /** Every node, known ones included. */
  nodes: string[];
  conductances: NodalConductance[];
  /** Nodes of known voltage in volts, the reference at 0 among them. */
  fixed: Record<string, number>;
  /** Amps put into a node from outside, such as a rectifier's average current. */
  injections: Record<string, number>;
}

/** One nodal equation as a person reads it, in three notations. */
export interface Equation {
  node: string;
  text: string;
  tex: string;
  mathml: string;
}

/** The expected values with their equations. */
export interface Working {
  nodes: string[];
  equations: Equation[];
  /** Volts of every node. */
  solution: Record<string, number>;
  notes: string[];
  /** What is left of the worst equation, as a fraction of its largest term. */
  residual: number;
  /** False when the numeric engine found something else; the notes then say where. */
  agreesWithSolver: boolean;
}

/** A reading as a function of one part's resistance. */
export interface ClosedForm {
  part: string;
  reading: Reading;
  text: string;
  tex: string;
  mathml: string;
  /** Ohms of the part that would explain the reading; null when none does. */
  impliedValue: number | null;
  unit: 'ohms';
  note: string;
}

/** A closed form before it is tied to a reading. */
export type ClosedFormAnswer = Omit<ClosedForm, 'reading'>;
