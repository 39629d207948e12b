import { type BranchLaws, branchLaws, chokeShare } from './branch-law';
import { Conduction } from './conduction';
import { type ElementOf, LIMITS } from './elements';
import { Elimination } from './elimination';
import { StepClock } from './propagator';
import type { Topology } from './topology';

/**
 * The block with every slow part at a given conductance: linear equations for each pattern of
 * conducting rectifiers, made when a pattern is first met and kept until a conductance changes.
 */
export class Network {
  readonly laws: BranchLaws;
  /** Patterns met so far, in order of appearance. */
  readonly met: Conduction[] = [];
  private readonly base: Elimination;
  private readonly work: Elimination;
  private readonly baseRhs: Float64Array;
  private readonly index = new Map<number, number>();

  readonly clock: StepClock;

  /** @param step longest step in seconds. */
  constructor(
    readonly block: Topology,
    step: number,
  ) {
    this.clock = new StepClock(block.omega, step);
    this.laws = branchLaws(block);
    this.base = new Elimination(block.unknowns, LIMITS.leastSiemens);
    this.work = new Elimination(block.unknowns, LIMITS.leastSiemens);
    this.baseRhs = new Float64Array(block.unknowns * block.width);
  }

  /** Sets the conductances of the slow parts (in order of `block.slow`) and forgets all patterns. */
  setSlow(siemens: ArrayLike<number>): void {
    const { block, laws, base, baseRhs } = this;
    block.slow.forEach((k, i) => {
      laws.siemens[k] = siemens[i];
    });
    this.met.length = 0;
    this.index.clear();
    base.clear();
    baseRhs.fill(0);
    block.elements.forEach((element, k) => {
      if (element.kind === 'rectifier' || block.isIdeal[k]) return;
      this.stamp(base, baseRhs, k, laws.siemens[k], laws.own[k], laws.sine[k], 0);
    });
  }

  /** Index in `met` of the equations for a pattern: bit i set when rectifier i conducts. */
  indexOf(pattern: number): number {
    let at = this.index.get(pattern);
    if (at === undefined) {
      at = this.met.push(new Conduction(this, pattern, this.solveNodes(pattern))) - 1;
      this.index.set(pattern, at);
    }
    return at;
  }

  /** Conductance of an element under a pattern. */
  siemensOf(k: number, pattern: number): number {
    const bit = this.block.rectifiers.indexOf(k);
    if (bit < 0 || (pattern & (1 << bit)) !== 0) return this.laws.siemens[k];
    return this.laws.blockedSiemens[k];
  }

  /** Volts of every unknown per ampere put into every unknown, n×n, under a pattern. */
  impedances(pattern: number): Float64Array {
    const n = this.block.unknowns;
    this.loadPattern(pattern, new Float64Array(n * this.block.width));
    const unit = new Float64Array(n * n);
    for (let i = 0; i < n; i += 1) unit[i * n + i] = 1;
    this.work.solve(unit, n);
    return unit;
  }

  private solveNodes(pattern: number): Float64Array {
    const rhs = this.baseRhs.slice();
    this.loadPattern(pattern, rhs);
    this.work.solve(rhs, this.block.width);
    return rhs;
  }

  private loadPattern(pattern: number, rhs: Float64Array): void {
    const { block, laws, work } = this;
    work.copyFrom(this.base);
    block.rectifiers.forEach((k, bit) => {
      const isOn = (pattern & (1 << bit)) !== 0;
      const siemens = isOn ? laws.siemens[k] : laws.blockedSiemens[k];
      if (siemens > 0) this.stamp(work, rhs, k, siemens, 0, 0, isOn ? laws.steady[k] : 0);
    });
    work.factor();
  }

  private stamp(
    into: Elimination,
    rhs: Float64Array,
    k: number,
    siemens: number,
    own: number,
    sine: number,
    steady: number,
  ): void {
    const { block } = this;
    const { states, width } = block;
    const { a, b } = block.elements[k];
    const i = block.unknownOf[a];
    const j = block.unknownOf[b];
    into.add(i, j, siemens);
    const toSine = sine + siemens * (block.offset[a] - block.offset[b]);
    const state = block.stateOf[k];
    if (i >= 0) {
      if (state >= 0) rhs[i * width + state] -= own;
      rhs[i * width + states] -= toSine;
      rhs[i * width + states + 2] -= steady;
    }
    if (j >= 0) {
      if (state >= 0) rhs[j * width + state] += own;
      rhs[j * width + states] += toSine;
      rhs[j * width + states + 2] += steady;
    }
  }

  /** Rate of each state: factors on the branch voltage and on the state itself. */
  rateFactors(state: number): { ofVolts: number; ofSelf: number } {
    const { block, laws } = this;
    const k = block.stateElement[state];
    const element = block.elements[k];
    if (element.kind === 'capacitor') {
      const rate = laws.siemens[k] / element.farads;
      return { ofVolts: rate, ofSelf: -rate };
    }
    const choke = element as ElementOf<'inductor'>;
    const { share } = chokeShare(choke, block.omega);
    const rate = share / Math.max(choke.henries, 1e-9);
    return { ofVolts: rate, ofSelf: -rate * Math.max(choke.ohms, 0) };
  }
}
