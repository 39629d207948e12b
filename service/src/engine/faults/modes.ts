import type { FaultMode, Part, PartKind } from '../netlist/types';

/** What a mode's unknown value is and where it can lie (netlist document). */
export interface UnknownValue {
  /** `factor` on the part's resistance or value, `ohms` of a leak or contact. */
  unit: 'factor' | 'ohms';
  low: number;
  high: number;
}

const HIGH: UnknownValue = { unit: 'factor', low: 1.3, high: 10 };
const LOW: UnknownValue = { unit: 'factor', low: 1 / 5, high: 1 / 1.3 };

/** Modes of every kind of part, with the unknown value each brings along. */
const MODES: Record<PartKind, Partial<Record<FaultMode, UnknownValue | null>>> = {
  resistor: { open: null, high: HIGH, low: LOW, bridged: null },
  heater: {
    open: null,
    shorted: null,
    'wrong-type': null,
    'heater-cathode-leak': { unit: 'ohms', low: 200, high: 5e5 },
  },
  lamp: { open: null, shorted: null, 'wrong-type': null },
  thermistor: { open: null, bridged: null, high: HIGH },
  switch: { open: null, 'poor-contact': { unit: 'ohms', low: 2, high: 2000 } },
  fuse: { open: null, 'poor-contact': { unit: 'ohms', low: 2, high: 2000 } },
  joint: { open: null, 'poor-contact': { unit: 'ohms', low: 2, high: 2000 } },
  capacitor: {
    open: null,
    low: { unit: 'factor', low: 1 / 20, high: 1 / 1.5 },
    leaky: { unit: 'ohms', low: 100, high: 5e6 },
    shorted: null,
    'high-esr': { unit: 'factor', low: 10, high: 500 },
  },
  rectifier: {
    open: null,
    shorted: null,
    weak: { unit: 'factor', low: 2, high: 10 },
    leaky: { unit: 'ohms', low: 100, high: 5e6 },
  },
  choke: { open: null, 'shorted-turns': { unit: 'factor', low: 0.3, high: 0.9 } },
  winding: { open: null, 'shorted-turns': { unit: 'factor', low: 0.3, high: 0.9 } },
  load: { overload: { unit: 'factor', low: 2, high: 20 }, 'no-load': null },
};

/** Every way a part can fail. A heater without a named cathode cannot leak to it. */
export function modesOf(part: Part): FaultMode[] {
  const modes = Object.keys(MODES[part.kind]) as FaultMode[];
  if (part.kind === 'heater' && part.cathode === undefined) {
    return modes.filter((mode) => mode !== 'heater-cathode-leak');
  }
  return modes;
}

/** The unknown value a mode brings along, or null when it has none. */
export function unknownOf(kind: PartKind, mode: FaultMode): UnknownValue | null {
  return MODES[kind][mode] ?? null;
}

/** One cell of an unknown value's range: its middle and its width in ln(value). */
export interface Cell {
  value: number;
  /** Width of the cell in ln(value). */
  width: number;
  /** Share of the prior, adding up to 1 over the cells. */
  share: number;
}

/**
 * Cuts the log-uniform prior of an unknown value into equal cells. A hypothesis is scored by the
 * mixture of its cells; within one cell the value counts as one more uncertain parameter.
 *
 * @param count number of cells, at least 1.
 */
export function cellsOf(unknown: UnknownValue, count: number): Cell[] {
  const low = Math.log(unknown.low);
  const width = (Math.log(unknown.high) - low) / count;
  return Array.from({ length: count }, (_, i) => ({
    value: Math.exp(low + (i + 0.5) * width),
    width,
    share: 1 / count,
  }));
}
