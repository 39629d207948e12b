import { type BranchValues, copyValues } from './branch-values';
import type { Circuit, Parameter } from './circuit';
import { Law } from './laws';

/**
 * Moves one uncertain parameter of a waveform block by a relative amount.
 *
 * @param from values of the hypothesis; left untouched.
 * @param into receives the moved values.
 * @param by relative change, 0.01 for one per cent up.
 * @returns the factor on the line voltage, and whether anything moved at all.
 */
export function perturb(
  circuit: Circuit,
  from: BranchValues,
  parameter: Parameter,
  by: number,
  into: BranchValues,
): { line: number; isMoved: boolean } {
  copyValues(from, into);
  const up = 1 + by;
  if (parameter.what === 'line') {
    circuit.parts.forEach((_, k) => {
      if (into.law[k] === Law.Winding) into.p0[k] *= up;
    });
    return { line: up, isMoved: true };
  }
  const k = parameter.part;
  if (k < 0 || circuit.isSteady[k] || from.state[k] === 1 || from.state[k] === 2) {
    return { line: 1, isMoved: false };
  }
  const isSecond = parameter.what === 'second';
  switch (into.law[k]) {
    case Law.Ohmic:
      if (isSecond) return { line: 1, isMoved: false };
      into.p0[k] /= up;
      break;
    case Law.Hot:
      if (isSecond) return { line: 1, isMoved: false };
      into.p1[k] *= up;
      into.p3[k] /= up;
      break;
    case Law.Ntc:
      if (isSecond) into.p3[k] *= up;
      else into.p0[k] *= up;
      break;
    case Law.Capacitor:
    case Law.Load:
      if (isSecond) into.p1[k] *= up;
      else into.p0[k] *= up;
      break;
    default:
      // Rectifier, choke, winding: ohms first, then drop, henries or volts.
      if (isSecond) into.p0[k] *= up;
      else into.p1[k] *= up;
  }
  return { line: 1, isMoved: true };
}
