import type { OperatingPoint } from '../diagnosis-types';
import { applyFaults, type SettledFault } from '../faults/apply';
import { healthyValues } from './branch-values';
import type { Circuit } from './circuit';
import { RmsNetwork } from './rms-network';

/**
 * Voltages at every node against the reference, and volts, amps and watts of every part, of the
 * healthy set or of one with faults. Values are RMS; nothing is loaded by a meter.
 *
 * @returns empty records when the set does not settle.
 */
export function operatingPoint(
  circuit: Circuit,
  faults: readonly SettledFault[] = [],
): OperatingPoint {
  const rms = new RmsNetwork(circuit);
  const out: OperatingPoint = { nodes: {}, parts: {} };
  if (!rms.solve(applyFaults(healthyValues(circuit), circuit, faults))) return out;
  const black = rms.volts[circuit.reference];
  circuit.nodes.forEach((node, index) => {
    if (rms.covers(index)) out.nodes[node] = { acVolts: Math.abs(rms.volts[index] - black) };
  });
  circuit.parts.forEach(({ ref }, k) => {
    if (!circuit.isSteady[k]) return;
    const { a, b } = circuit.branches[k];
    const volts = Math.abs(rms.volts[a] - rms.volts[b]);
    const amps = Math.abs(rms.amps[k]);
    out.parts[ref] = { volts, amps, watts: volts * amps };
  });
  return out;
}
