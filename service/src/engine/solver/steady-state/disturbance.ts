import type { Conduction } from './conduction';
import type { Network } from './network';
import { tieIdealSources } from './topology';

/** A figure of an element that a result can be differentiated by. */
export type Field =
  | 'ohms'
  | 'farads'
  | 'esr'
  | 'henries'
  | 'dropVolts'
  | 'reverseOhms'
  | 'volts'
  | 'amps'
  | 'exponent'
  | 'coldRatio'
  | 'hotOhms'
  | 'coldOhms';

/**
 * What a small relative change of one figure does to the linear equations of one pattern. It acts
 * like one extra waveform ψ (a row over ξ) that moves node voltages and the rates of the states.
 */
export interface Disturbance {
  psi: Float64Array;
  /** Volts of every node per unit of ψ at fixed states. */
  nodes: Float64Array;
  /** Rate of every state per unit of ψ. */
  rates: Float64Array;
  /** Element that carries ψ as extra current of its own, −1 for none. */
  carriedBy: number;
}

/** Extra current from a to b inside an element: its effect per ampere. */
function carried(
  network: Network,
  impedances: Float64Array,
  k: number,
  psi: Float64Array,
): Disturbance {
  const { block } = network;
  const { a, b } = block.elements[k];
  const put = new Float64Array(block.unknowns);
  if (block.unknownOf[a] >= 0) put[block.unknownOf[a]] -= 1;
  if (block.unknownOf[b] >= 0) put[block.unknownOf[b]] += 1;
  const nodes = spread(network, impedances, put);
  const rates = ratesOf(network, nodes);
  const element = block.elements[k];
  if (element.kind === 'capacitor') rates[block.stateOf[k]] += 1 / element.farads;
  return { psi, nodes, rates, carriedBy: k };
}

/** Volts of every node for amps put into the unknowns. */
function spread(network: Network, impedances: Float64Array, put: Float64Array): Float64Array {
  const { unknowns: n, unknownOf, nodes } = network.block;
  const volts = new Float64Array(nodes);
  for (let node = 0; node < nodes; node += 1) {
    const i = unknownOf[node];
    if (i < 0) continue;
    for (let j = 0; j < n; j += 1) volts[node] += impedances[i * n + j] * put[j];
  }
  return volts;
}

function ratesOf(network: Network, nodes: Float64Array): Float64Array {
  const { block } = network;
  return Float64Array.from(block.stateElement, (k, s) => {
    const { a, b } = block.elements[k];
    return network.rateFactors(s).ofVolts * (nodes[a] - nodes[b]);
  });
}

/** A change that acts on the rate of one state alone. */
function onState(network: Network, state: number, psi: Float64Array): Disturbance {
  const { block } = network;
  const rates = new Float64Array(block.states);
  rates[state] = 1;
  return { psi, nodes: new Float64Array(block.nodes), rates, carriedBy: -1 };
}

/**
 * Disturbance of one figure under one pattern; nothing when the figure does not matter there.
 * Slow parts answer as conductances: `amps` stands for ln(siemens).
 *
 * @param impedances `network.impedances` of that pattern.
 */
export function disturbanceOf(
  network: Network,
  conduction: Conduction,
  impedances: Float64Array,
  k: number,
  field: Field,
): Disturbance | undefined {
  const { block, laws } = network;
  const { width, states } = block;
  const element = block.elements[k];
  const psi = new Float64Array(width);
  const times = (row: Float64Array, factor: number): Float64Array =>
    row.map((value) => value * factor);
  const current = () => conduction.currentRow(k, psi);
  const through = (row: Float64Array) => carried(network, impedances, k, row);
  switch (element.kind) {
    case 'resistance':
      return field === 'ohms' ? through(times(current(), -1)) : undefined;
    case 'load':
    case 'hot':
    case 'ntc':
      if (field === 'amps') return through(current());
      return field === 'volts' ? through(times(current(), -1)) : undefined;
    case 'capacitor': {
      if (field === 'esr') {
        return laws.siemens[k] * element.esr === 1 ? through(times(current(), -1)) : undefined;
      }
      if (field !== 'farads') return undefined;
      return onState(network, block.stateOf[k], times(current(), -1 / element.farads));
    }
    case 'inductor': {
      const state = block.stateOf[k];
      if (field === 'ohms') {
        psi[state] = network.rateFactors(state).ofSelf;
        return onState(network, state, psi);
      }
      if (field !== 'henries') return undefined;
      for (let j = 0; j < states; j += 1) psi[j] = -conduction.a[state * states + j];
      for (let j = 0; j < 3; j += 1) psi[states + j] = -conduction.b[state * 3 + j];
      return onState(network, state, psi);
    }
    case 'rectifier': {
      const isOn = (conduction.pattern & (1 << block.rectifiers.indexOf(k))) !== 0;
      if (field === 'ohms' && isOn) return through(times(current(), -1));
      if (field === 'reverseOhms' && !isOn) return through(times(current(), -1));
      if (field !== 'dropVolts' || !isOn) return undefined;
      psi[width - 1] = laws.steady[k];
      return through(psi);
    }
    case 'source':
      if (field === 'ohms' && !block.isIdeal[k]) return through(times(current(), -1));
      if (field !== 'volts') return undefined;
      if (block.isIdeal[k]) return idealVolts(network, conduction, impedances, k);
      psi[states] = laws.sine[k];
      return through(psi);
  }
}

/** A change of an ideal source's volts moves whatever is tied to it, and with it every branch there. */
function idealVolts(
  network: Network,
  conduction: Conduction,
  impedances: Float64Array,
  k: number,
): Disturbance {
  const { block } = network;
  const alone = block.elements.map((element, other) =>
    element.kind === 'source' && other !== k ? { ...element, volts: 0 } : element,
  );
  const { offset } = tieIdealSources(alone, block.nodes);
  const put = new Float64Array(block.unknowns);
  block.elements.forEach(({ a, b }, other) => {
    if (block.isIdeal[other]) return;
    const amps = network.siemensOf(other, conduction.pattern) * (offset[a] - offset[b]);
    if (amps === 0) return;
    if (block.unknownOf[a] >= 0) put[block.unknownOf[a]] -= amps;
    if (block.unknownOf[b] >= 0) put[block.unknownOf[b]] += amps;
  });
  const nodes = spread(network, impedances, put).map((volts, node) => volts + offset[node]);
  const psi = new Float64Array(block.width);
  psi[block.states] = 1;
  return { psi, nodes, rates: ratesOf(network, nodes), carriedBy: -1 };
}
