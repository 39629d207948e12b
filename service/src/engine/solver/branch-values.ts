import { SETTINGS } from '../tolerances';
import type { Circuit } from './circuit';
import { Law } from './laws';
import type { CapacitorPart } from '../netlist/types';

/**
 * What every branch is under one hypothesis. Arrays have one entry per branch of the circuit; a
 * copy is made for each hypothesis and faults are written into it.
 */
export interface BranchValues {
  law: Uint8Array;
  p0: Float64Array;
  p1: Float64Array;
  p2: Float64Array;
  p3: Float64Array;
  /** Conductance to an ohmmeter, siemens. */
  cold: Float64Array;
  /** 0 as made, 1 open, 2 shorted: decides which uncertainty the branch carries. */
  state: Uint8Array;
  /** Fault (0, 1, …) whose unknown value scales this branch's resistance, −1 for none. */
  scaledBy: Int8Array;
}

/** Values of `n` branches that carry nothing. */
export function blankValues(n: number): BranchValues {
  return {
    law: new Uint8Array(n),
    p0: new Float64Array(n),
    p1: new Float64Array(n),
    p2: new Float64Array(n),
    p3: new Float64Array(n),
    cold: new Float64Array(n),
    state: new Uint8Array(n),
    scaledBy: new Int8Array(n).fill(-1),
  };
}

/**
 * Capacitance to expect: electrolytics are made from −20 % to +50 %, so their middle is 15 % above
 * the marking (EIA practice, from memory).
 */
function expectedFarads(part: CapacitorPart): number {
  return part.make === 'electrolytic' ? 1.15 * part.farads : part.farads;
}

function setWave(
  values: BranchValues,
  k: number,
  law: Law,
  p0: number,
  p1: number,
  p2: number,
  cold: number,
): void {
  values.law[k] = law;
  values.p0[k] = p0;
  values.p1[k] = p1;
  values.p2[k] = p2;
  values.cold[k] = cold;
}

/** Values of the healthy set. */
export function healthyValues(circuit: Circuit): BranchValues {
  const values = blankValues(circuit.branches.length);
  const design = circuit.netlist.line?.volts ?? 0;
  // A transformer's secondaries follow the line of the day.
  const ratio = design > 0 ? circuit.lineVolts / design : 1;
  circuit.parts.forEach((part, k) => {
    switch (part.kind) {
      case 'heater':
      case 'lamp':
        setHot(values, k, part.volts, part.amps, part.exponent!, part.coldRatio!);
        break;
      case 'thermistor':
        values.law[k] = Law.Ntc;
        values.p0[k] = part.hotOhms;
        values.p1[k] = part.amps;
        values.p2[k] = part.exponent!;
        values.p3[k] = part.coldOhms;
        values.cold[k] = 1 / part.coldOhms;
        break;
      case 'resistor':
      case 'switch':
      case 'fuse':
      case 'joint':
        setOhms(values, k, part.ohms!);
        break;
      // Capacitors, rectifiers and loads pass nothing an ohmmeter could see.
      case 'capacitor':
        setWave(values, k, Law.Capacitor, expectedFarads(part), part.esr!, Infinity, 0);
        break;
      case 'rectifier':
        setWave(values, k, Law.Rectifier, part.dropVolts!, part.ohms!, Infinity, 0);
        break;
      case 'choke':
        setWave(values, k, Law.Choke, part.henries, part.ohms, 0, 1 / part.ohms);
        break;
      case 'winding':
        setWave(values, k, Law.Winding, part.volts * ratio, part.ohms, part.phase!, 1 / part.ohms);
        break;
      case 'load':
        setWave(values, k, Law.Load, part.amps, part.volts, part.exponent!, 0);
        break;
    }
  });
  return values;
}

/** Copies values into others of the same circuit, so that a hypothesis can write into them. */
export function copyValues(from: BranchValues, to: BranchValues): BranchValues {
  to.law.set(from.law);
  to.p0.set(from.p0);
  to.p1.set(from.p1);
  to.p2.set(from.p2);
  to.p3.set(from.p3);
  to.cold.set(from.cold);
  to.state.set(from.state);
  to.scaledBy.set(from.scaledBy);
  return to;
}

/** Puts a plain resistance into a branch. */
export function setOhms(values: BranchValues, k: number, ohms: number): void {
  values.law[k] = Law.Ohmic;
  values.p0[k] = 1 / ohms;
  values.cold[k] = 1 / ohms;
}

/** Puts a heater or lamp of the given rating into a branch. */
export function setHot(
  values: BranchValues,
  k: number,
  volts: number,
  amps: number,
  exponent: number,
  coldRatio: number,
): void {
  values.law[k] = Law.Hot;
  values.p0[k] = volts;
  values.p1[k] = amps;
  values.p2[k] = exponent;
  values.p3[k] = volts / amps / coldRatio;
  values.cold[k] = 1 / values.p3[k];
}

/** Opens a branch: 1 GΩ in its place. */
export function setOpen(values: BranchValues, k: number): void {
  setOhms(values, k, SETTINGS.openOhms);
  values.state[k] = 1;
}

/** Shorts or bridges a branch: 0.01 Ω in its place. */
export function setShorted(values: BranchValues, k: number): void {
  setOhms(values, k, SETTINGS.shortOhms);
  values.state[k] = 2;
}
