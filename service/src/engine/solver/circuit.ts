import { withDefaults } from '../netlist/defaults';
import type { Netlist, Part } from '../netlist/types';
import { SETTINGS } from '../tolerances';
import { splitBlocks } from './blocks';

/** Something that is not known exactly: a part's value, a cold ratio, the line voltage. */
export interface Parameter {
  /** Index of the part, −1 for one that the whole set shares. */
  part: number;
  what: 'value' | 'second' | 'exponent' | 'line' | 'open';
  /** Standard deviation of the relative deviation (of the exponent itself for `exponent`). */
  sigma: number;
}

/** One end-to-end way for current: a part, or a leak from a heater to its cathode. */
export interface Branch {
  a: number;
  b: number;
  /** Index of the part it belongs to. */
  part: number;
  isLeak: boolean;
}

/** A checked netlist with nodes and parts as integers; made once and shared by all hypotheses. */
export interface Circuit {
  netlist: Netlist;
  /** Parts with every default filled in; the line's source resistance, if any, comes last. */
  parts: Part[];
  partIndex: Map<string, number>;
  nodes: string[];
  nodeIndex: Map<string, number>;
  reference: number;
  /** Node of the hot side, −1 without a line. */
  hot: number;
  return: number;
  lineVolts: number;
  hertz: number;
  /** The first branches are the parts in order; leaks of heaters follow. */
  branches: Branch[];
  /** Branch of a heater's leak, −1 for none. */
  leakOf: Int32Array;
  /** True for branches solved as RMS values, false for those of a block with a rectifier or reactance. */
  isSteady: Uint8Array;
  parameters: Parameter[];
  valueParameter: Int32Array;
  /**
   * Second uncertainty of a part, −1 for none: cold resistance of heaters, lamps and thermistors;
   * series resistance of capacitors, drop of rectifiers, inductance of chokes, volts of windings.
   */
  secondParameter: Int32Array;
  heaterExponent: number;
  lampExponent: number;
  lineParameter: number;
  openParameter: number;
}

/** Relative standard deviation of a part's main value; ±t uniform gives t/√3. */
export function valueSigma(part: Part): number {
  switch (part.kind) {
    case 'switch':
    case 'fuse':
    case 'joint':
      return SETTINGS.contactSpread;
    case 'rectifier':
      return SETTINGS.rectifierSpread;
    case 'capacitor':
      // Electrolytics: −20 % to +50 %, evenly.
      if (part.make === 'electrolytic') return 0.7 / Math.sqrt(12) / 1.15;
      return (part.tolerance ?? 0.2) / Math.sqrt(3);
    default:
      return (part.tolerance ?? 0.1) / Math.sqrt(3);
  }
}

/** Relative standard deviation of a part's second value; 0 where it has none. */
export function secondSigma(part: Part): number {
  switch (part.kind) {
    case 'heater':
    case 'lamp':
      return SETTINGS.coldRatioSpread;
    case 'thermistor':
      return valueSigma(part);
    case 'capacitor':
      return SETTINGS.esrSpread;
    case 'rectifier':
      return SETTINGS.dropSpread;
    case 'choke':
      return 0.2 / Math.sqrt(3);
    case 'winding':
      return SETTINGS.windingSpread;
    default:
      return 0;
  }
}

/** Name of the line's source resistance and of the node behind it; no reference can be like it. */
export const LINE_OHMS = '(line)';

/**
 * Turns a checked netlist into integers and lists what is uncertain about it.
 *
 * @param netlist as found, free of problems that `checkNetlist` names.
 * @param lineVolts RMS line voltage of the day; the design value when left out.
 */
export function compileCircuit(netlist: Netlist, lineVolts?: number): Circuit {
  const parts = netlist.parts.map(withDefaults);
  const { line } = netlist;
  const hasSourceOhms = line?.ohms !== undefined && line.ohms > 0;
  if (hasSourceOhms) {
    // The source resistance is a part nobody can suspect, behind a node nobody can reach.
    parts.push({ ref: LINE_OHMS, kind: 'joint', between: [LINE_OHMS, line.hot], ohms: line.ohms });
  }
  const nodes: string[] = [];
  const nodeIndex = new Map<string, number>();
  const indexOf = (node: string): number => {
    let index = nodeIndex.get(node);
    if (index === undefined) {
      index = nodes.push(node) - 1;
      nodeIndex.set(node, index);
    }
    return index;
  };
  const reference = indexOf(netlist.reference);
  const hot = line ? indexOf(hasSourceOhms ? LINE_OHMS : line.hot) : -1;
  const back = line ? indexOf(line.return) : -1;
  const branches: Branch[] = parts.map((part, index) => ({
    a: indexOf(part.between[0]),
    b: indexOf(part.between[1]),
    part: index,
    isLeak: false,
  }));
  const leakOf = new Int32Array(parts.length).fill(-1);
  parts.forEach((part, index) => {
    if (part.kind !== 'heater' || part.cathode === undefined) return;
    leakOf[index] =
      branches.push({
        a: branches[index].a,
        b: indexOf(part.cathode),
        part: index,
        isLeak: true,
      }) - 1;
  });

  const parameters: Parameter[] = [];
  const add = (parameter: Parameter): number => parameters.push(parameter) - 1;
  const lineParameter = add({ part: -1, what: 'line', sigma: SETTINGS.lineSpread });
  const openParameter = add({ part: -1, what: 'open', sigma: SETTINGS.openSpread });
  const heaterExponent = add({ part: -1, what: 'exponent', sigma: SETTINGS.exponentSpread });
  const lampExponent = add({ part: -1, what: 'exponent', sigma: SETTINGS.exponentSpread });
  const valueParameter = new Int32Array(parts.length);
  const secondParameter = new Int32Array(parts.length).fill(-1);
  parts.forEach((part, index) => {
    valueParameter[index] = add({ part: index, what: 'value', sigma: valueSigma(part) });
    const second = secondSigma(part);
    if (second > 0) secondParameter[index] = add({ part: index, what: 'second', sigma: second });
  });

  return {
    netlist,
    parts,
    partIndex: new Map(parts.map((part, index) => [part.ref, index])),
    nodes,
    nodeIndex,
    reference,
    hot,
    return: back,
    lineVolts: lineVolts ?? line?.volts ?? 0,
    hertz: line?.hertz ?? 60,
    branches,
    leakOf,
    isSteady: splitBlocks(parts, branches, nodes.length, hot, back),
    parameters,
    valueParameter,
    secondParameter,
    heaterExponent,
    lampExponent,
    lineParameter,
    openParameter,
  };
}
