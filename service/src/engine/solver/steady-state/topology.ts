import { type BranchElement, LIMITS } from './elements';

/**
 * A block compiled for solving. The driving quantities are ξ = (states, sin ωt, cos ωt, 1), of
 * length `width`; every voltage and current of the block is a row over ξ.
 */
export interface Topology {
  elements: readonly BranchElement[];
  nodes: number;
  omega: number;
  period: number;
  /** Number of unknown node voltages. */
  unknowns: number;
  /** Unknown of each node, −1 when it is the reference but for its offset. */
  unknownOf: Int32Array;
  /** Peak of the sine that ideal sources put between a node and its unknown. */
  offset: Float64Array;
  /** Number of states: capacitor volts and choke amps. */
  states: number;
  /** State of each element, −1 for none. */
  stateOf: Int32Array;
  /** Element of each state. */
  stateElement: number[];
  /** Elements that are rectifiers, in order of their bit in a pattern. */
  rectifiers: number[];
  /** Elements whose conductance follows from the cycle: curved loads, heaters, lamps, thermistors. */
  slow: number[];
  /** 1 for a source without resistance. */
  isIdeal: Uint8Array;
  /** Length of ξ. */
  width: number;
  /** Largest peak voltage of a source, the scale of all tolerances; 1 without a source. */
  scale: number;
}

/** Signed peak volts of a source. */
export function sourcePeak(source: { volts: number; phase: 0 | 180 }): number {
  return Math.SQRT2 * source.volts * (source.phase === 180 ? -1 : 1);
}

/**
 * Ties the ends of sources without resistance together, so that they need no unknown of their own.
 *
 * @returns for each node the node it follows and the sine's peak between the two; marks the sources
 *   that were tied. One that would close a loop of ideal sources is left to a resistance of
 *   `LIMITS.leastRectifierOhms`.
 */
export function tieIdealSources(
  elements: readonly BranchElement[],
  nodes: number,
): { leader: Int32Array; offset: Float64Array; isIdeal: Uint8Array } {
  const leader = Int32Array.from({ length: nodes }, (_, node) => node);
  const offset = new Float64Array(nodes);
  const isIdeal = new Uint8Array(elements.length);
  elements.forEach((element, k) => {
    if (element.kind !== 'source' || element.ohms > 0) return;
    const { a, b } = element;
    if (leader[a] === leader[b]) return;
    isIdeal[k] = 1;
    // The reference leads whatever it is tied to.
    const [from, to, sign] = leader[a] === 0 ? [b, a, -1] : [a, b, 1];
    const shift = offset[to] + sign * sourcePeak(element) - offset[from];
    const old = leader[from];
    for (let node = 0; node < nodes; node += 1) {
      if (leader[node] !== old) continue;
      leader[node] = leader[to];
      offset[node] += shift;
    }
  });
  return { leader, offset, isIdeal };
}

/**
 * Compiles a block.
 *
 * @param elements elements between nodes 0 … nodes − 1.
 * @param hertz line frequency.
 */
export function compileBlock(
  elements: readonly BranchElement[],
  nodes: number,
  hertz: number,
): Topology {
  const { leader, offset, isIdeal } = tieIdealSources(elements, nodes);
  const unknownOf = new Int32Array(nodes).fill(-1);
  let unknowns = 0;
  for (let node = 1; node < nodes; node += 1) {
    if (leader[node] === node) unknownOf[node] = unknowns++;
  }
  for (let node = 0; node < nodes; node += 1) unknownOf[node] = unknownOf[leader[node]];
  const stateOf = new Int32Array(elements.length).fill(-1);
  const stateElement: number[] = [];
  const rectifiers: number[] = [];
  const slow: number[] = [];
  let scale = 0;
  elements.forEach((element, k) => {
    switch (element.kind) {
      case 'capacitor':
      case 'inductor':
        stateOf[k] = stateElement.push(k) - 1;
        break;
      case 'rectifier':
        rectifiers.push(k);
        break;
      case 'load':
        if (element.exponent !== 1 && element.amps > 0) slow.push(k);
        break;
      case 'hot':
      case 'ntc':
        slow.push(k);
        break;
      case 'source':
        scale = Math.max(scale, Math.abs(sourcePeak(element)));
        break;
      default:
        break;
    }
  });
  return {
    elements,
    nodes,
    omega: 2 * Math.PI * hertz,
    period: 1 / hertz,
    unknowns,
    unknownOf,
    offset,
    states: stateElement.length,
    stateOf,
    stateElement,
    rectifiers,
    slow,
    isIdeal,
    width: stateElement.length + 3,
    scale: scale || 1,
  };
}

/** Series resistance a capacitor is solved with. */
export function solvedEsr(farads: number, esr: number, omega: number): number {
  return Math.max(esr, LIMITS.leastEsr / (omega * farads));
}
