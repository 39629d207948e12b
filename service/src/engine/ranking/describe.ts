import type { Fault } from '../diagnosis-types';
import { logSumExp } from './normal';
import type { CellPosterior, ScoredSet } from './fault-set';

/** Value below which `share` of the posterior lies, over cells in ascending order of value. */
function quantile(edges: number[], weights: number[], share: number): number {
  let sum = 0;
  for (let i = 0; i < weights.length; i += 1) {
    if (sum + weights[i] >= share && weights[i] > 0) {
      const inside = (share - sum) / weights[i];
      return Math.exp(edges[i] + inside * (edges[i + 1] - edges[i]));
    }
    sum += weights[i];
  }
  return Math.exp(edges[edges.length - 1]);
}

/** Best value and 95 % interval of an unknown from the posterior of its cells. */
function valueOf({ cells, logs }: CellPosterior): Pick<Fault, 'value' | 'interval'> {
  const total = logSumExp(logs);
  const weights = logs.map((log) => Math.exp(log - total));
  const edges = cells.map(({ fault }) => Math.log(fault.value!) - fault.width! / 2);
  const last = cells[cells.length - 1].fault;
  edges.push(Math.log(last.value!) + last.width! / 2);
  return {
    value: quantile(edges, weights, 0.5),
    interval: [quantile(edges, weights, 0.025), quantile(edges, weights, 0.975)],
  };
}

/** Types that have the given rating, within 6 %. */
function typesOf(
  volts: number,
  amps: number,
  data: readonly { type: string; volts: number; amps: number }[],
): string[] {
  return data
    .filter(
      (other) =>
        Math.abs(Math.log(other.volts / volts)) <= 0.06 &&
        Math.abs(Math.log(other.amps / amps)) <= 0.06,
    )
    .map(({ type }) => type);
}

/** The faults of a set as they are told: with value, interval, rating and types. */
export function describeFaults(
  set: ScoredSet,
  tubes: readonly { type: string; volts: number; amps: number }[],
  lamps: readonly { type: string; volts: number; amps: number }[],
): Fault[] {
  return set.atoms.map((atom, slot): Fault => {
    const fault = set.best[slot];
    const base = { part: atom.ref, mode: atom.mode };
    if (atom.mode === 'wrong-type') {
      const { volts = 0, amps = 0 } = fault;
      const types = typesOf(volts, amps, [...tubes, ...lamps]).slice(0, 8);
      return { ...base, volts, amps, types };
    }
    if (fault.value === undefined) return base;
    const isOhms = ['heater-cathode-leak', 'leaky', 'poor-contact'].includes(atom.mode);
    return { ...base, ...valueOf(set.cells[slot]), valueUnit: isOhms ? 'ohms' : 'factor' };
  });
}
