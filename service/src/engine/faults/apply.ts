import type { FaultMode } from '../netlist/types';
import {
  type BranchValues,
  blankValues,
  copyValues,
  setHot,
  setOhms,
  setOpen,
  setShorted,
} from '../solver/branch-values';
import type { Circuit } from '../solver/circuit';
import { Law } from '../solver/laws';

/** A fault with its unknown settled: one branch of a hypothesis. */
export interface SettledFault {
  /** Index of the part. */
  part: number;
  mode: FaultMode;
  /** Factor or ohms, for modes that have an unknown. */
  value?: number;
  /** Width of the cell in ln(value), for modes that have an unknown. */
  width?: number;
  /** Rating fitted instead, for `wrong-type`. */
  volts?: number;
  amps?: number;
}

/** Multiplies the resistance of a branch, whatever its law. */
function scaleOhms(values: BranchValues, k: number, factor: number): void {
  if (values.law[k] === Law.Ohmic) values.p0[k] /= factor;
  else if (values.law[k] === Law.Ntc) {
    values.p0[k] *= factor;
    values.p3[k] *= factor;
  }
  values.cold[k] /= factor;
}

/** Writes one fault into branch values; `slot` is its place in the hypothesis. */
function writeFault(
  values: BranchValues,
  circuit: Circuit,
  fault: SettledFault,
  slot: number,
): void {
  const k = fault.part;
  const part = circuit.parts[k];
  switch (fault.mode) {
    case 'open':
      setOpen(values, k);
      return;
    case 'shorted':
    case 'bridged':
      setShorted(values, k);
      return;
    case 'high':
    case 'low':
      if (part.kind === 'capacitor') {
        values.p0[k] *= fault.value!;
        return;
      }
      scaleOhms(values, k, fault.value!);
      values.scaledBy[k] = slot;
      return;
    case 'poor-contact':
      setOhms(values, k, fault.value!);
      values.state[k] = 3;
      values.scaledBy[k] = slot;
      return;
    case 'wrong-type':
      if (part.kind !== 'heater' && part.kind !== 'lamp') return;
      setHot(values, k, fault.volts!, fault.amps!, part.exponent!, part.coldRatio!);
      return;
    case 'heater-cathode-leak': {
      const leak = circuit.leakOf[k];
      setOhms(values, leak, fault.value!);
      values.state[leak] = 3;
      values.scaledBy[leak] = slot;
      return;
    }
    case 'leaky':
      values.p2[k] = fault.value!;
      values.cold[k] = 1 / fault.value!;
      values.state[k] = 3;
      values.scaledBy[k] = slot;
      return;
    case 'high-esr':
      values.p1[k] *= fault.value!;
      return;
    case 'weak':
      values.p0[k] *= fault.value!;
      values.p1[k] *= fault.value!;
      return;
    case 'overload':
      values.p0[k] *= fault.value!;
      return;
    case 'no-load':
      setOpen(values, k);
      values.cold[k] = 0;
      return;
    case 'shorted-turns': {
      const factor = fault.value!;
      // Ohms and volts shrink with the turns; a choke's inductance falls much further.
      values.p0[k] *= part.kind === 'choke' ? Math.max(0.05, 0.5 * factor * factor) : factor;
      values.p1[k] *= factor;
      values.cold[k] /= factor;
      values.scaledBy[k] = slot;
      return;
    }
  }
}

/**
 * Branch values of a set with the given faults.
 *
 * @param healthy values of the healthy set; left untouched.
 * @param faults one fault per part at most.
 * @param into values to write into, of the same circuit.
 */
export function applyFaults(
  healthy: BranchValues,
  circuit: Circuit,
  faults: readonly SettledFault[],
  into: BranchValues = blankValues(circuit.branches.length),
): BranchValues {
  copyValues(healthy, into);
  faults.forEach((fault, slot) => writeFault(into, circuit, fault, slot));
  return into;
}
