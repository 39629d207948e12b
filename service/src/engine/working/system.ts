import type { NodalConductance, NodalSystem } from '../expected';
import { healthyValues } from '../solver/branch-values';
import type { Circuit } from '../solver/circuit';
import { Law } from '../solver/laws';
import { RmsNetwork } from '../solver/rms-network';
import { WaveNetwork } from '../solver/wave-network';

/** A linear network at its operating point, with what a person should know about it. */
export interface DescribedSystem {
  system: NodalSystem;
  notes: string[];
}

/** A system with the numeric engine's own answer beside it. */
export interface CheckedSystem extends DescribedSystem {
  check: Record<string, number>;
  /** How closely two ways of solving can agree: averages over a cycle carry an error of their own. */
  agreement: number;
}

function unknownNodes(
  branches: readonly NodalConductance[],
  fixed: Record<string, number>,
): string[] {
  const nodes = new Set(branches.flatMap(({ a, b }) => [a, b]));
  return [...nodes].filter((node) => !(node in fixed));
}

/** Blocks of resistances and hot parts: RMS values, every hot part at the resistance it settles at. */
export function alternatingSystem(circuit: Circuit): CheckedSystem | null {
  const steady = circuit.parts.map((_, k) => k).filter((k) => circuit.isSteady[k]);
  if (steady.length === 0 || circuit.hot < 0) return null;
  const rms = new RmsNetwork(circuit);
  if (!rms.solve(healthyValues(circuit))) return null;
  const name = (node: number) => circuit.nodes[node];
  const branches = steady.map((k): NodalConductance => {
    const { a, b } = circuit.branches[k];
    const across = rms.volts[a] - rms.volts[b];
    return { part: circuit.parts[k].ref, a: name(a), b: name(b), siemens: rms.amps[k] / across };
  });
  // A branch without any voltage says nothing of its resistance; its slope does.
  branches.forEach((branch, i) => {
    if (!Number.isFinite(branch.siemens)) branch.siemens = 1 / rms.slope[steady[i]];
  });
  const fixed = { [name(circuit.hot)]: circuit.lineVolts, [name(circuit.return)]: 0 };
  const nodes = unknownNodes(branches, fixed);
  const hot = steady.filter((k) =>
    ['heater', 'lamp', 'thermistor'].includes(circuit.parts[k].kind),
  );
  return {
    system: {
      nodes: [...nodes, ...Object.keys(fixed)],
      conductances: branches,
      fixed,
      injections: {},
    },
    notes:
      hot.length > 0
        ? [
            'Heaters, lamps and thermistors stand at the resistance they settle at with this line voltage.',
          ]
        : [],
    agreement: 1e-6,
    check: Object.fromEntries(nodes.map((node) => [node, rms.volts[circuit.nodeIndex.get(node)!]])),
  };
}

/** Blocks with rectifiers: average values, each rectifier replaced by the average current found for it. */
export function directSystem(circuit: Circuit): CheckedSystem | null {
  const wave = new WaveNetwork(circuit);
  if (!wave.isNeeded) return null;
  const values = healthyValues(circuit);
  const solution = wave.solve(values);
  if (!solution) return null;
  const { state, element } = solution;
  const name = (node: number) => circuit.nodes[node];
  const largest = Math.max(
    ...circuit.nodes.map((_, node) =>
      Math.abs(wave.rowOf(node) > 0 ? state.pair(wave.rowOf(node), 0).mean : 0),
    ),
  );
  // Below a millionth of the largest average the cycle cannot tell a voltage from none.
  const mean = (node: number) => {
    const value = state.pair(wave.rowOf(node), 0).mean;
    return Math.abs(value) < 1e-6 * largest ? 0 : value;
  };
  const branches: NodalConductance[] = [];
  const injections: Record<string, number> = {};
  const inject = (node: number, amps: number) => {
    injections[name(node)] = (injections[name(node)] ?? 0) + amps;
  };
  for (const k of wave.branches) {
    if (element[k] < 0) continue;
    const { a, b, part } = circuit.branches[k];
    const law = values.law[k];
    if (law === Law.Capacitor) continue;
    const amps = state.current(element[k]).mean;
    if (law === Law.Rectifier) {
      inject(a, -amps);
      inject(b, amps);
      continue;
    }
    const across = mean(a) - mean(b);
    const ohms =
      law === Law.Ohmic
        ? 1 / values.p0[k]
        : law === Law.Load || law === Law.Hot || law === Law.Ntc
          ? across / amps
          : values.p1[k];
    if (!Number.isFinite(ohms) || ohms <= 0) continue;
    branches.push({ part: circuit.parts[part].ref, a: name(a), b: name(b), siemens: 1 / ohms });
  }
  const ground = wave.rowOf(circuit.return) === 0 ? circuit.return : circuit.reference;
  const fixed: Record<string, number> = { [name(ground)]: 0 };
  // The line carries no direct voltage.
  if (circuit.hot >= 0 && wave.rowOf(circuit.hot) > 0) fixed[name(circuit.hot)] = 0;
  const nodes = [...new Set([...unknownNodes(branches, fixed), ...Object.keys(injections)])].filter(
    (node) => !(node in fixed),
  );
  // A node between a capacitor and rectifiers alone has no direct path; its average comes from the waveform.
  const lone = nodes.filter((node) => !branches.some(({ a, b }) => a === node || b === node));
  for (const node of lone) fixed[node] = mean(circuit.nodeIndex.get(node)!);
  const kept = nodes.filter((node) => !lone.includes(node));
  return {
    system: {
      nodes: [...kept, ...Object.keys(fixed)],
      conductances: branches,
      fixed,
      // What is put into a node of known voltage changes nothing.
      injections: Object.fromEntries(
        Object.entries(injections).filter(([node]) => !(node in fixed)),
      ),
    },
    notes: [
      'In the rectifier block each rectifier is replaced by the average current that the cycle-by-cycle solution found for it; capacitors carry no direct current.',
    ],
    agreement: 1e-5,
    check: Object.fromEntries(kept.map((node) => [node, mean(circuit.nodeIndex.get(node)!)])),
  };
}

/** The set switched off, with an ohmmeter putting one ampere in at the red lead. */
export function coldSystem(circuit: Circuit, red: string, black: string): NodalSystem {
  const values = healthyValues(circuit);
  const branches = circuit.parts.flatMap(({ ref }, k): NodalConductance[] => {
    if (values.cold[k] === 0) return [];
    const { a, b } = circuit.branches[k];
    return [{ part: ref, a: circuit.nodes[a], b: circuit.nodes[b], siemens: values.cold[k] }];
  });
  const fixed = { [black]: 0 };
  return {
    nodes: [...unknownNodes(branches, fixed), black],
    conductances: branches,
    fixed,
    injections: { [red]: 1 },
  };
}
