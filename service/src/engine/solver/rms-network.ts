import { SETTINGS } from '../tolerances';
import type { BranchValues } from './branch-values';
import type { Circuit } from './circuit';
import { hotLaw, Law, type LawPoint, ntcLaw } from './laws';
import { narrowOrder, ProfileMatrix } from './profile-matrix';

/** Newton steps before a set is given up. */
const MOST_STEPS = 60;

/**
 * Powered state of all blocks that hold only resistances and hot parts: RMS values, real numbers,
 * the line's return at 0 V. Modified nodal analysis (Ho, Ruehli, Brennan 1975) with the source
 * eliminated, since both its nodes are known; Newton on the currents of the hot parts.
 *
 * One instance belongs to one circuit and keeps the last solution; it allocates nothing per solve.
 */
export class RmsNetwork {
  /** RMS volts of every node, signed by phase against the line's return. */
  readonly volts: Float64Array;
  /** Amps of every branch from `a` to `b`. */
  readonly amps: Float64Array;
  /** dV/dI of every branch at the operating point, ohms. */
  readonly slope: Float64Array;
  /** 1 where a hot part is on its cold branch. */
  readonly isCold: Uint8Array;
  /** Newton steps the last solve took. */
  steps = 0;
  private readonly row: Int32Array;
  private readonly matrix: ProfileMatrix;
  private readonly rhs: Float64Array;
  private readonly active: Int32Array;
  /** Volts of each hot part by its law at the present current. */
  private readonly lawVolts: Float64Array;
  private readonly point: LawPoint = { volts: 0, slope: 0, isCold: false };

  constructor(private readonly circuit: Circuit) {
    const { branches, nodes, isSteady } = circuit;
    this.volts = new Float64Array(nodes.length);
    this.amps = new Float64Array(branches.length);
    this.slope = new Float64Array(branches.length).fill(Infinity);
    this.isCold = new Uint8Array(branches.length);
    this.lawVolts = new Float64Array(branches.length);
    this.active = Int32Array.from(
      branches.map((_, k) => k).filter((k) => isSteady[branches[k].part]),
    );
    this.row = new Int32Array(nodes.length).fill(-1);
    const isFree = (node: number) => node !== circuit.hot && node !== circuit.return;
    const used = new Set<number>([circuit.reference]);
    this.active.forEach((k) => used.add(branches[k].a).add(branches[k].b));
    const free = [...used].filter(isFree);
    free.forEach((node, i) => {
      this.row[node] = i;
    });
    const edges: [number, number][] = [];
    this.active.forEach((k) => {
      const i = this.row[branches[k].a];
      const j = this.row[branches[k].b];
      if (i >= 0 && j >= 0) edges.push([i, j]);
    });
    const order = narrowOrder(free.length, edges);
    free.forEach((node, i) => {
      this.row[node] = order[i];
    });
    this.matrix = new ProfileMatrix(
      free.length,
      edges.map(([i, j]) => [order[i], order[j]] as const),
    );
    this.rhs = new Float64Array(free.length);
  }

  /** True when the node's voltage is part of this state (not inside a waveform block). */
  covers(node: number): boolean {
    return this.row[node] >= 0 || node === this.circuit.hot || node === this.circuit.return;
  }

  /**
   * Settles the set under the given values.
   *
   * @returns false when it does not settle; the solution is then not to be used.
   */
  solve(values: BranchValues): boolean {
    const { circuit, volts, amps, active } = this;
    const line = circuit.lineVolts;
    if (circuit.hot >= 0) {
      volts[circuit.hot] = line;
      volts[circuit.return] = 0;
    }
    for (let x = 0; x < active.length; x += 1) {
      const k = active[x];
      // Every hot part starts at its rated current: the hot side of a thermistor's knee.
      amps[k] = values.law[k] === Law.Ohmic ? 0 : values.p1[k];
    }
    for (let step = 1; step <= MOST_STEPS; step += 1) {
      this.steps = step;
      const damping = step > 15 ? 0.5 : 1;
      if (!this.assemble(values)) return false;
      this.matrix.solve(this.rhs);
      const moved = this.accept(values, damping);
      if (moved < 1e-7 * Math.max(line, 1) && step > 1) return true;
      if (!Number.isFinite(moved)) return false;
    }
    return false;
  }

  /** Voltage response to one ampere put in at `a` and taken out at `b`, as node volts. */
  response(a: number, b: number, out: Float64Array): Float64Array {
    const { row, rhs } = this;
    rhs.fill(0);
    if (row[a] >= 0) rhs[row[a]] += 1;
    if (row[b] >= 0) rhs[row[b]] -= 1;
    this.matrix.solve(rhs);
    for (let node = 0; node < out.length; node += 1) {
      out[node] = row[node] >= 0 ? rhs[row[node]] : 0;
    }
    return out;
  }

  /** Builds the linearised equations around the present currents and factors them. */
  private assemble(values: BranchValues): boolean {
    const { matrix, rhs, row, circuit, amps, slope, isCold, active, point, volts, lawVolts } = this;
    matrix.clear();
    rhs.fill(0);
    for (let i = 0; i < matrix.n; i += 1) matrix.add(i, i, SETTINGS.leastSiemens);
    for (let x = 0; x < active.length; x += 1) {
      const k = active[x];
      const branch = circuit.branches[k];
      const i = row[branch.a];
      const j = row[branch.b];
      let siemens = values.p0[k];
      let norton = 0;
      if (values.law[k] !== Law.Ohmic) {
        if (values.law[k] === Law.Hot) {
          hotLaw(amps[k], values.p0[k], values.p1[k], values.p2[k], values.p3[k], point);
        } else {
          ntcLaw(amps[k], values.p0[k], values.p1[k], values.p2[k], values.p3[k], point);
        }
        siemens = 1 / point.slope;
        norton = amps[k] - point.volts * siemens;
        lawVolts[k] = point.volts;
        isCold[k] = point.isCold ? 1 : 0;
      }
      slope[k] = siemens === 0 ? Infinity : 1 / siemens;
      if (siemens === 0) continue;
      matrix.addConductance(i, j, siemens);
      if (i >= 0) rhs[i] += (j < 0 ? siemens * volts[branch.b] : 0) - norton;
      if (j >= 0) rhs[j] += (i < 0 ? siemens * volts[branch.a] : 0) + norton;
    }
    return matrix.factor();
  }

  /** Takes over the new voltages, moves the currents, and says how far any voltage went. */
  private accept(values: BranchValues, damping: number): number {
    const { rhs, row, circuit, amps, slope, volts, active, lawVolts } = this;
    let moved = 0;
    for (let node = 0; node < volts.length; node += 1) {
      const i = row[node];
      if (i < 0) continue;
      moved = Math.max(moved, Math.abs(rhs[i] - volts[node]));
      volts[node] = rhs[i];
    }
    for (let x = 0; x < active.length; x += 1) {
      const k = active[x];
      const { a, b } = circuit.branches[k];
      const across = volts[a] - volts[b];
      if (values.law[k] === Law.Ohmic) {
        amps[k] = values.p0[k] * across;
        continue;
      }
      const next = amps[k] + (across - lawVolts[k]) / slope[k];
      // What the law and the new voltage disagree about counts as movement too.
      moved = Math.max(moved, Math.abs(across - lawVolts[k]) * (Math.abs(slope[k]) < 1e7 ? 1 : 0));
      amps[k] += damping * (next - amps[k]);
    }
    return moved;
  }
}
