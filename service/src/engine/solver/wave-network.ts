import { SETTINGS } from '../tolerances';
import type { BranchValues } from './branch-values';
import type { Circuit } from './circuit';
import { Law } from './laws';
import {
  type BranchElement,
  solveSteadyState,
  type SteadyState,
  type WarmStart,
} from './steady-state';

/** Leak resistances above this are left out. */
const SOUND_LEAK = 1e8;

/** A powered block with rectifiers or reactance, solved; asks by the circuit's own nodes and branches. */
export interface WaveSolution {
  state: SteadyState;
  /** Element of each branch, −1 for branches that are not part of it. */
  element: Int32Array;
  /** Element of the line's source, −1 when the block does not touch the line. */
  line: number;
}

/**
 * All blocks of a circuit that hold a rectifier, a reactance, a winding or a load, in periodic
 * steady state. The line is an ideal source between its own nodes.
 */
export class WaveNetwork {
  /** Branches that belong to waveform blocks. */
  readonly branches: number[];
  private readonly row: Int32Array;
  private readonly count: number;
  private readonly hasLine: boolean;
  private warm: WarmStart | undefined;

  constructor(private readonly circuit: Circuit) {
    const { branches, isSteady, hot, nodes } = circuit;
    this.row = new Int32Array(nodes.length).fill(-1);
    this.branches = branches
      .map((_, k) => k)
      .filter((k) => !isSteady[k] && (!branches[k].isLeak || !isSteady[branches[k].part]));
    const used = new Set<number>();
    this.branches.forEach((k) => used.add(branches[k].a).add(branches[k].b));
    this.hasLine = hot >= 0 && used.has(hot);
    if (this.hasLine) used.add(circuit.return);
    const ground = this.hasLine ? circuit.return : circuit.reference;
    this.row[ground] = 0;
    let next = 1;
    for (const node of used) if (node !== ground) this.row[node] = next++;
    this.count = next;
  }

  /** True when there is anything to solve. */
  get isNeeded(): boolean {
    return this.branches.length > 0;
  }

  /** Row of a node in the block's own numbering, −1 when it is not part of it. */
  rowOf(node: number): number {
    return this.row[node];
  }

  /**
   * Settles the block under the given values.
   *
   * @param line factor on the line voltage.
   * @param meter a meter's resistance between two nodes, as part of the circuit.
   * @returns null when it does not settle.
   */
  solve(
    values: BranchValues,
    line = 1,
    meter?: { a: number; b: number; ohms: number },
  ): WaveSolution | null {
    const { circuit } = this;
    const elements: BranchElement[] = [];
    const element = new Int32Array(circuit.branches.length).fill(-1);
    const leaks: BranchElement[] = [];
    for (const k of this.branches) {
      const made = this.elementOf(values, k, leaks);
      if (made) element[k] = elements.push(made) - 1;
    }
    let source = -1;
    if (this.hasLine) {
      source =
        elements.push({
          kind: 'source',
          a: this.row[circuit.hot],
          b: this.row[circuit.return],
          volts: circuit.lineVolts * line,
          phase: 0,
          ohms: 0,
        }) - 1;
    }
    elements.push(...leaks);
    if (meter) {
      const { a, b, ohms } = meter;
      elements.push({ kind: 'resistance', a: this.row[a], b: this.row[b], ohms });
    }
    const state = solveSteadyState(elements, this.count, circuit.hertz, { start: this.warm });
    if (!state.converged) return null;
    this.warm ??= state.warmStart;
    return { state, element, line: source };
  }

  /** A branch as the solver takes it; leaks across it go into a list of their own. */
  private elementOf(values: BranchValues, k: number, leaks: BranchElement[]): BranchElement | null {
    const branch = this.circuit.branches[k];
    const a = this.row[branch.a];
    const b = this.row[branch.b];
    const [p0, p1, p2, p3] = [values.p0[k], values.p1[k], values.p2[k], values.p3[k]];
    const leak = () => {
      if (p2 < SOUND_LEAK) leaks.push({ kind: 'resistance', a, b, ohms: p2 });
    };
    switch (values.law[k]) {
      case Law.Ohmic:
        if (p0 === 0) return null;
        return { kind: 'resistance', a, b, ohms: Math.min(1 / p0, SETTINGS.openOhms) };
      case Law.Hot:
        return { kind: 'hot', a, b, volts: p0, amps: p1, exponent: p2, coldRatio: p0 / p1 / p3 };
      case Law.Ntc:
        return { kind: 'ntc', a, b, hotOhms: p0, amps: p1, exponent: p2, coldOhms: p3 };
      case Law.Capacitor:
        leak();
        return { kind: 'capacitor', a, b, farads: p0, esr: p1 };
      case Law.Rectifier:
        leak();
        return { kind: 'rectifier', a, b, dropVolts: p0, ohms: p1 };
      case Law.Choke:
        return { kind: 'inductor', a, b, henries: p0, ohms: p1 };
      case Law.Winding:
        return { kind: 'source', a, b, volts: p0, phase: p2 === 180 ? 180 : 0, ohms: p1 };
      default:
        return { kind: 'load', a, b, amps: p0, volts: p1, exponent: p2 };
    }
  }
}
