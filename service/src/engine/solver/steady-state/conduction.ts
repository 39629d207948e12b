import type { Network } from './network';
import { Propagator } from './propagator';

/** The block's linear equations while one pattern of rectifiers conducts; rows over ξ. */
export class Conduction {
  /** A (n×n) and B (n×3) of the state equations x' = A·x + B·(sin, cos, 1). */
  readonly a: Float64Array;
  readonly b: Float64Array;
  /** Per rectifier: voltage beyond its drop (off), or current times its ohms (on), and its rate. */
  readonly gap: Float64Array;
  readonly gapRate: Float64Array;
  private made: Propagator | undefined;

  /** @param volts rows of the unknown node voltages, unknowns×width. */
  constructor(
    private readonly network: Network,
    readonly pattern: number,
    private readonly volts: Float64Array,
  ) {
    const { block } = network;
    const { states, width, rectifiers } = block;
    this.a = new Float64Array(states * states);
    this.b = new Float64Array(states * 3);
    const row = new Float64Array(width);
    for (let s = 0; s < states; s += 1) {
      const { a, b } = block.elements[block.stateElement[s]];
      this.pairRow(a, b, row);
      const { ofVolts, ofSelf } = network.rateFactors(s);
      for (let j = 0; j < states; j += 1) this.a[s * states + j] = ofVolts * row[j];
      this.a[s * states + s] += ofSelf;
      for (let j = 0; j < 3; j += 1) this.b[s * 3 + j] = ofVolts * row[states + j];
    }
    this.gap = new Float64Array(rectifiers.length * width);
    this.gapRate = new Float64Array(rectifiers.length * width);
    rectifiers.forEach((k, i) => {
      const element = block.elements[k];
      this.pairRow(element.a, element.b, row);
      if (element.kind === 'rectifier') row[width - 1] -= element.dropVolts;
      this.gap.set(row, i * width);
      this.gapRate.set(this.rateRow(row), i * width);
    });
  }

  /** Exact steps of the states under this pattern. */
  get propagator(): Propagator {
    const { block, clock } = this.network;
    this.made ??= new Propagator(block.states, this.a, this.b, clock);
    return this.made;
  }

  /** Row of the voltage from node a to node b. */
  pairRow(a: number, b: number, row: Float64Array): Float64Array {
    const { block } = this.network;
    const { width } = block;
    const i = block.unknownOf[a] * width;
    const j = block.unknownOf[b] * width;
    for (let c = 0; c < width; c += 1) {
      row[c] = (i >= 0 ? this.volts[i + c] : 0) - (j >= 0 ? this.volts[j + c] : 0);
    }
    row[block.states] += block.offset[a] - block.offset[b];
    return row;
  }

  /** Row of the rate of change of a quantity given by its row. */
  rateRow(row: Float64Array): Float64Array {
    const { states, width, omega } = this.network.block;
    const rate = new Float64Array(width);
    for (let s = 0; s < states; s += 1) {
      if (row[s] === 0) continue;
      for (let j = 0; j < states; j += 1) rate[j] += row[s] * this.a[s * states + j];
      for (let j = 0; j < 3; j += 1) rate[states + j] += row[s] * this.b[s * 3 + j];
    }
    rate[states] -= omega * row[states + 1];
    rate[states + 1] += omega * row[states];
    return rate;
  }

  /** Row of an element's current, from `a` through it to `b`. */
  currentRow(k: number, row: Float64Array): Float64Array {
    const { network } = this;
    const { block, laws } = network;
    if (block.isIdeal[k]) return this.idealSourceRow(k, row);
    const element = block.elements[k];
    this.pairRow(element.a, element.b, row);
    const siemens = network.siemensOf(k, this.pattern);
    for (let c = 0; c < block.width; c += 1) row[c] *= siemens;
    if (block.stateOf[k] >= 0) row[block.stateOf[k]] += laws.own[k];
    row[block.states] += laws.sine[k];
    if (element.kind === 'rectifier' && siemens === laws.siemens[k]) {
      row[block.width - 1] += laws.steady[k];
    }
    return row;
  }

  /**
   * Elements whose currents add up to that of a source without resistance, by Kirchhoff's current
   * law on the side of its tie that does not hold the reference.
   */
  termsOf(k: number): { element: number; factor: number }[] {
    const { block } = this.network;
    const side = this.sideOf(k);
    const sign = side.has(block.elements[k].a) ? -1 : 1;
    const terms: { element: number; factor: number }[] = [];
    block.elements.forEach((element, other) => {
      if (other === k || block.isIdeal[other]) return;
      const leaves = (side.has(element.a) ? 1 : 0) - (side.has(element.b) ? 1 : 0);
      if (leaves !== 0) terms.push({ element: other, factor: sign * leaves });
    });
    return terms;
  }

  private idealSourceRow(k: number, row: Float64Array): Float64Array {
    const { width } = this.network.block;
    const one = new Float64Array(width);
    row.fill(0);
    for (const { element, factor } of this.termsOf(k)) {
      this.currentRow(element, one);
      for (let c = 0; c < width; c += 1) row[c] += factor * one[c];
    }
    return row;
  }

  /** Nodes tied together on one side of an ideal source when that source is taken out. */
  private sideOf(k: number): Set<number> {
    const { block } = this.network;
    const reach = (start: number): Set<number> => {
      const found = new Set([start]);
      for (let grown = true; grown;) {
        grown = false;
        block.elements.forEach((element, other) => {
          if (other === k || !block.isIdeal[other]) return;
          if (found.has(element.a) === found.has(element.b)) return;
          found.add(element.a).add(element.b);
          grown = true;
        });
      }
      return found;
    };
    const side = reach(block.elements[k].a);
    return side.has(0) ? reach(block.elements[k].b) : side;
  }
}
