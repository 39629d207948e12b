import { CycleRunner } from './cycle';
import { solveDense } from './dense';
import type { BranchElement } from './elements';
import { gatherGram, momentsOf } from './gram';
import { Network } from './network';
import { ratedSiemens, type SlowElement, slowPoint, SlowSearch } from './slow-parts';
import { SteadyState, type WarmStart } from './steady-state';
import { compileBlock, type Topology } from './topology';

/** How a block is solved. */
export interface SolveOptions {
  /** Steps per cycle: where rectifiers are looked at. Default 64. */
  steps?: number;
  /** A solved neighbour: the same nodes, elements mostly at the same places in the list. */
  start?: SteadyState | WarmStart;
  /** Size of the last Newton step, as a fraction of the largest source voltage. Default 1e-6. */
  tolerance?: number;
  /** Cycles before giving up. Default 80. */
  mostCycles?: number;
}

const SLOW_TOLERANCE = 1e-7;

/**
 * Periodic steady state of a block with rectifiers.
 *
 * Between switchings the block is linear and is integrated exactly; Newton's method on the states
 * at the start of a cycle (shooting: T. Aprille, T. Trick, Proc. IEEE 60 (1972) 108-114) finds the
 * cycle that repeats, however slow the filters are. Loads, heaters, lamps and thermistors keep one
 * conductance through a cycle; it is settled in the same loop.
 *
 * The last Newton step is added to the samples, so what is left is of the order of its square. The
 * result is marked as not converged when the limit of cycles is reached; it then holds the last cycle.
 *
 * @param elements elements between nodes 0 … nodes − 1, node 0 being the reference.
 * @param nodes number of nodes.
 * @param hertz frequency of all sources.
 * @returns voltages in volts against node 0, currents in amps from `a` to `b`.
 */
export function solveSteadyState(
  elements: readonly BranchElement[],
  nodes: number,
  hertz: number,
  options: SolveOptions = {},
): SteadyState {
  const block = compileBlock(elements, nodes, hertz);
  const network = new Network(block, block.period / (options.steps ?? 64));
  const runner = new CycleRunner(network);
  const tolerance = options.tolerance ?? 1e-6;
  const mostCycles = options.mostCycles ?? 80;
  const start = options.start instanceof SteadyState ? options.start.warmStart : options.start;
  const { states } = block;
  const x0 = firstStates(block, start);
  let z = firstSlow(block, start);
  const search = new SlowSearch(z.length);
  const weights = stateWeights(block);
  const monodromy = new Float64Array(states * states);

  for (let cycle = 1; ; cycle += 1) {
    if (z.length > 0 || cycle === 1) network.setSlow(z.map(Math.exp));
    runner.run(x0, monodromy);
    const step = newtonStep(x0, runner.end, monodromy, states);
    const size = largestOf(step, weights) / block.scale;
    const isSmall = size <= tolerance;
    const isLast = cycle >= mostCycles;
    const isNear = size < 0.3;
    if (step && isNear && (isSmall || z.length > 0)) runner.correct(step);
    let miss = 0;
    if (z.length > 0 && (isNear || isLast)) {
      const gram = gatherGram(network, runner.trace);
      const r = slowMiss(network, gram, z);
      miss = r.reduce((most, value) => Math.max(most, Math.abs(value)), 0);
      if (!(isSmall && miss <= SLOW_TOLERANCE) && !isLast) z = search.next(z, r);
      else
        return new SteadyState(
          network,
          runner.trace,
          isSmall && miss <= SLOW_TOLERANCE,
          cycle,
          gram,
        );
    } else if (isSmall || isLast) {
      return new SteadyState(
        network,
        runner.trace,
        isSmall,
        cycle,
        gatherGram(network, runner.trace),
      );
    }
    moveStates(x0, step, runner.end, cycle);
  }
}

/** Newton's step on the start states; nothing when the linear system is singular. */
function newtonStep(
  x0: Float64Array,
  end: Float64Array,
  monodromy: Float64Array,
  n: number,
): Float64Array | undefined {
  const matrix = new Float64Array(n * n);
  const step = new Float64Array(n);
  for (let i = 0; i < n; i += 1) {
    step[i] = end[i] - x0[i];
    for (let j = 0; j < n; j += 1) matrix[i * n + j] = (i === j ? 1 : 0) - monodromy[j * n + i];
  }
  if (!solveDense(matrix, step, n)) return undefined;
  return step.every(Number.isFinite) ? step : undefined;
}

/**
 * Takes the Newton step. Should it not settle, full steps are followed by a halved one and by a
 * plain cycle in turn, which breaks any circle Newton goes round in.
 */
function moveStates(
  x0: Float64Array,
  step: Float64Array | undefined,
  end: Float64Array,
  cycle: number,
): void {
  const turn = cycle > 20 ? cycle % 3 : 0;
  if (!step || turn === 1) {
    x0.set(end);
    return;
  }
  const factor = turn === 2 ? 0.5 : 1;
  for (let i = 0; i < x0.length; i += 1) x0[i] += factor * step[i];
}

/** Volts that one unit of each state stands for: chokes count with their reactance. */
function stateWeights(block: Topology): Float64Array {
  return Float64Array.from(block.stateElement, (k) => {
    const element = block.elements[k];
    return element.kind === 'inductor' ? block.omega * element.henries : 1;
  });
}

function largestOf(step: Float64Array | undefined, weights: Float64Array): number {
  if (!step) return Infinity;
  let largest = 0;
  for (let i = 0; i < step.length; i += 1) {
    largest = Math.max(largest, Math.abs(step[i]) * weights[i]);
  }
  return largest;
}

/** ln of what each slow part's law asks for, less ln of the conductance the cycle was run with. */
function slowMiss(
  network: Network,
  gram: ReturnType<typeof gatherGram>,
  z: Float64Array,
): Float64Array {
  const { block } = network;
  const rows = new Float64Array(network.met.length * block.width);
  return z.map((value, i) => {
    const element = block.elements[block.slow[i]] as SlowElement;
    network.met.forEach((conduction, m) => {
      const row = rows.subarray(m * block.width, (m + 1) * block.width);
      conduction.pairRow(element.a, element.b, row);
    });
    const moments = momentsOf(network, gram, rows);
    const volts = element.kind === 'load' ? moments.mean : moments.rms;
    return Math.log(slowPoint(element, volts, Math.exp(value)).siemens) - value;
  });
}

function firstStates(block: Topology, start: WarmStart | undefined): Float64Array {
  const x0 = new Float64Array(block.states);
  if (!start) return x0;
  block.stateElement.forEach((k, s) => {
    const element = block.elements[k];
    const old = start.elements[k];
    const isSame = old?.kind === element.kind && old.a === element.a && old.b === element.b;
    if (isSame) x0[s] = start.state[k];
    else if (element.kind === 'capacitor') {
      x0[s] = (start.nodeVolts[element.a] ?? 0) - (start.nodeVolts[element.b] ?? 0);
    }
  });
  return x0;
}

function firstSlow(block: Topology, start: WarmStart | undefined): Float64Array {
  return Float64Array.from(block.slow, (k) => {
    const element = block.elements[k] as SlowElement;
    const rated = ratedSiemens(element);
    const old = start?.elements[k];
    // The state the neighbour was in carries over as a factor on the rating.
    const factor =
      start && old?.kind === element.kind ? start.siemens[k] / ratedSiemens(old as SlowElement) : 1;
    return Math.log(rated * (Number.isFinite(factor) && factor > 0 ? factor : 1));
  });
}
