import type { DiagnosisInput, OperatingPoint } from './diagnosis-types';
import { applyAsFound } from './netlist/as-found';
import { requireSound } from './netlist/require-sound';
import { compileCircuit } from './solver/circuit';
import { operatingPoint } from './solver/operating-point';

/**
 * The healthy set, as found and at the day's line voltage: volts at every node, and volts, amps and
 * watts of every part.
 *
 * @throws NetlistError when the circuit cannot be solved; it names parts or nodes.
 */
export function solve(
  input: Pick<DiagnosisInput, 'netlist' | 'asFound' | 'conditions'>,
): OperatingPoint {
  const netlist = applyAsFound(input.netlist, input.asFound ?? []);
  requireSound(netlist, []);
  return operatingPoint(compileCircuit(netlist, input.conditions?.lineVolts));
}
