import { SETTINGS } from '../tolerances';
import type { Circuit } from './circuit';
import { narrowOrder, ProfileMatrix } from './profile-matrix';

/**
 * The set switched off, as an ohmmeter sees it: line unplugged, sources off, tubes drawing nothing,
 * rectifiers and capacitors open. Linear: one factorisation answers every pair of leads.
 */
export class ColdNetwork {
  private readonly row: Int32Array;
  private readonly matrix: ProfileMatrix;
  private readonly rhs: Float64Array;

  constructor(private readonly circuit: Circuit) {
    const { branches, nodes, reference } = circuit;
    const free = nodes.map((_, node) => node).filter((node) => node !== reference);
    this.row = new Int32Array(nodes.length).fill(-1);
    free.forEach((node, i) => {
      this.row[node] = i;
    });
    const edges: [number, number][] = branches
      .map(({ a, b }) => [this.row[a], this.row[b]] as [number, number])
      .filter(([i, j]) => i >= 0 && j >= 0 && i !== j);
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

  /**
   * Factors the network with one conductance per branch.
   *
   * @returns false when a node is cut off altogether.
   */
  solve(siemens: Float64Array): boolean {
    const { matrix, row, circuit } = this;
    matrix.clear();
    for (let i = 0; i < matrix.n; i += 1) matrix.add(i, i, SETTINGS.leastSiemens);
    circuit.branches.forEach(({ a, b }, k) => {
      if (siemens[k] > 0) matrix.addConductance(row[a], row[b], siemens[k]);
    });
    return matrix.factor();
  }

  /**
   * Volts of every node while one ampere flows in at `a` and out at `b`; the difference between the
   * two is the resistance in ohms.
   */
  response(a: number, b: number, out: Float64Array): Float64Array {
    const { row, rhs } = this;
    rhs.fill(0);
    if (row[a] >= 0) rhs[row[a]] += 1;
    if (row[b] >= 0) rhs[row[b]] -= 1;
    this.matrix.solve(rhs);
    for (let node = 0; node < out.length; node += 1)
      out[node] = row[node] >= 0 ? rhs[row[node]] : 0;
    return out;
  }
}
