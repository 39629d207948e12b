import { CycleRunner } from './cycle';
import { gatherGram, type Gram, momentsOf } from './gram';
import { Network } from './network';
import { ShootingSearch } from './newton';
import { ratedSiemens, type SlowElement, slowPoint, SlowSearch } from './slow-parts';
import type { BranchElement } from './elements';
import { SteadyState, type WarmStart } from './steady-state';
import { compileBlock, type Topology } from './topology';

/** How a block is solved. */
export interface SolveOptions {
  /** Steps per cycle: where rectifiers are looked at. Default 64, more when a choke rings faster. */
  steps?: number;
  /** A solved neighbour: the same nodes, elements mostly at the same places in the list. */
  start?: SteadyState | WarmStart;
  /**
   * Size of the last Newton step, as a fraction of the largest source voltage; conductances of slow
   * parts settle to a tenth of it. Default 1e-6.
   */
  tolerance?: number;
  /** Cycles before giving up. Default 100. */
  mostCycles?: number;
}

const STEPS = 64;
const MOST_STEPS = 512;
/** Newton steps above this fraction of scale say little about averages yet. */
const FAR = 0.3;
/** From this cycle on slow parts move by half of what their law asks for. */
const PATIENCE = 20;
/** After this many cycles one that repeats this well, as a fraction of scale, is good enough. */
const LAST_RESORT = 60;
const REPEATS = 1e-7;

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
  const network = new Network(block, block.period / (options.steps ?? stepsFor(block)));
  const runner = new CycleRunner(network);
  const tolerance = (options.tolerance ?? 1e-6) * block.scale;
  const slowTolerance = (options.tolerance ?? 1e-6) / 10;
  const mostCycles = options.mostCycles ?? 100;
  const start = options.start instanceof SteadyState ? options.start.warmStart : options.start;
  const x0 = firstStates(block, start);
  let z = firstSlow(block, start);
  const slow = new SlowSearch(z.length);
  const search = new ShootingSearch(block.states, stateWeights(block));
  const monodromy = new Float64Array(block.states * block.states);
  const hasSlow = z.length > 0;

  for (let cycle = 1; ; cycle += 1) {
    if (hasSlow || cycle === 1) network.setSlow(z.map(Math.exp));
    runner.run(x0, monodromy);
    search.observe(x0, runner.end, monodromy);
    const change = search.measure(runner.end.map((end, i) => end - x0[i]));
    const isClose =
      search.size <= tolerance || (cycle > LAST_RESORT && change <= REPEATS * block.scale);
    const isLast = cycle >= mostCycles;
    let isSettled = true;
    let gram: Gram | undefined;
    if (hasSlow && search.size < FAR * block.scale) {
      runner.correct(search.step);
      gram = gatherGram(network, runner.trace);
      const miss = slowMiss(network, gram, z);
      isSettled = miss.every((value) => Math.abs(value) <= slowTolerance);
      if (!isSettled && !isLast) {
        z = cycle > PATIENCE ? z.map((value, i) => value + 0.5 * miss[i]) : slow.next(z, miss);
      }
    } else if (isClose && search.size <= tolerance) {
      runner.correct(search.step);
    }
    const isDone = isClose && isSettled;
    if (isDone || isLast) {
      gram ??= gatherGram(network, runner.trace);
      return new SteadyState(network, runner.trace, isDone && !runner.isRough, cycle, gram);
    }
    search.next(x0, runner.end);
  }
}

/** Enough steps to see the fastest ringing of a choke with a capacitor beside it. */
function stepsFor(block: Topology): number {
  let fastest = 0;
  for (const k of block.stateElement) {
    const choke = block.elements[k];
    if (choke.kind !== 'inductor') continue;
    for (const other of block.stateElement) {
      const capacitor = block.elements[other];
      if (capacitor.kind !== 'capacitor') continue;
      const ends = [capacitor.a, capacitor.b].filter((node) => node !== 0);
      if (!ends.includes(choke.a) && !ends.includes(choke.b)) continue;
      fastest = Math.max(fastest, 1 / Math.sqrt(Math.max(choke.henries, 1e-9) * capacitor.farads));
    }
  }
  const wanted = Math.ceil(2 * fastest * block.period);
  return Math.min(Math.max(wanted, STEPS), MOST_STEPS);
}

/** Volts that one unit of each state stands for: chokes count with their reactance. */
function stateWeights(block: Topology): Float64Array {
  return Float64Array.from(block.stateElement, (k) => {
    const element = block.elements[k];
    return element.kind === 'inductor' ? block.omega * element.henries : 1;
  });
}

/** ln of what each slow part's law asks for, less ln of the conductance the cycle was run with. */
function slowMiss(network: Network, gram: Gram, z: Float64Array): Float64Array {
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
