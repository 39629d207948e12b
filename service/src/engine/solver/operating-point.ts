import type { OperatingPoint } from '../diagnosis-types';
import { applyFaults, type SettledFault } from '../faults/apply';
import { type BranchValues, healthyValues } from './branch-values';
import { type Circuit, LINE_OHMS } from './circuit';
import { RmsNetwork } from './rms-network';
import { WaveNetwork } from './wave-network';

/** Averages below this are none; a meter would show zero. */
const LEAST_VOLTS = 1e-4;

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
  const values = applyFaults(healthyValues(circuit), circuit, faults);
  if (!rms.solve(values)) return out;
  const black = rms.volts[circuit.reference];
  circuit.nodes.forEach((node, index) => {
    if (rms.covers(index) && circuit.hot >= 0 && node !== LINE_OHMS)
      out.nodes[node] = { acVolts: Math.abs(rms.volts[index] - black) };
  });
  circuit.netlist.parts.forEach(({ ref }, k) => {
    if (!circuit.isSteady[k]) return;
    const { a, b } = circuit.branches[k];
    const volts = Math.abs(rms.volts[a] - rms.volts[b]);
    const amps = Math.abs(rms.amps[k]);
    out.parts[ref] = { volts, amps, watts: volts * amps };
  });
  addWaveforms(circuit, values, out);
  return out;
}

/** Adds what the blocks with rectifiers show: averages and ripple at nodes, RMS values at parts. */
function addWaveforms(circuit: Circuit, values: BranchValues, out: OperatingPoint): void {
  const wave = new WaveNetwork(circuit);
  if (!wave.isNeeded) return;
  const solution = wave.solve(values);
  if (!solution) return;
  const { state, element } = solution;
  const black = wave.rowOf(circuit.reference);
  circuit.nodes.forEach((node, index) => {
    const row = wave.rowOf(index);
    if (row < 0 || black < 0 || index === circuit.hot || index === circuit.return) return;
    const { mean, acRms } = state.pair(row, black);
    out.nodes[node] = {
      dcVolts: Math.abs(mean) < LEAST_VOLTS ? 0 : mean,
      acVolts: acRms,
      rippleVolts: state.pairPeakToPeak(row, black),
    };
  });
  for (const k of wave.branches) {
    const { a, b, part, isLeak } = circuit.branches[k];
    if (isLeak || element[k] < 0) continue;
    out.parts[circuit.parts[part].ref] = {
      volts: state.pair(wave.rowOf(a), wave.rowOf(b)).rms,
      amps: state.current(element[k]).rms,
      watts: Math.abs(state.power(element[k])),
    };
  }
}
