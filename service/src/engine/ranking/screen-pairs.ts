import type { SettledFault } from '../faults/apply';
import type { Atom, AtomCell } from '../faults/atoms';
import type { ScoredSet } from './fault-set';
import { logSumExp } from './normal';
import type { PriorModel } from './priors';
import type { Scorer } from './scorer';
import { SETTINGS } from '../tolerances';

/** A pair of faults that may explain the readings, before its full score. */
export interface ScreenedPair {
  atoms: [Atom, Atom];
  start: [SettledFault, SettledFault];
  estimate: number;
}

/** One settled version of an atom with the spread of every reading beside it. */
export interface Version {
  cell: AtomCell;
  sigma: Float64Array;
}

/** Versions of an atom kept where both faults of a pair have an unknown value. */
const BEST_VERSIONS = 2;

const LOG_ROOT_2PI = 0.5 * Math.log(2 * Math.PI);

/** Versions of one atom by itself, likeliest first. */
export function versionsOf(scorer: Scorer, atom: Atom): Version[] {
  const n = scorer.observations.length;
  const out: { version: Version; log: number }[] = [];
  for (const cell of atom.coarse) {
    const scored = scorer.scoreWithSpread([cell.fault]);
    if (!scored) continue;
    const sigma = Float64Array.from({ length: n }, (_, r) => scored.sigma[r]);
    out.push({ version: { cell, sigma }, log: cell.logShare + scored.like.log });
  }
  return out.sort((x, y) => y.log - x.log).map(({ version }) => version);
}

/**
 * Rough log-likelihood: every reading by itself, normal with the wider spread of the two faults, or
 * a slip.
 */
export function roughLog(
  scorer: Scorer,
  mean: Float64Array,
  x: Float64Array,
  y: Float64Array,
): number {
  const { observations } = scorer;
  let log = 0;
  for (let r = 0; r < observations.length; r += 1) {
    const { isOver, y: measured, logWide, spec } = observations[r];
    if (spec.take === 'sign') continue;
    if (isOver) {
      log += mean[r] > Math.log(spec.meter.overOhms) ? 0 : Math.log(SETTINGS.slipChance * 0.2);
      continue;
    }
    const sigma = Math.max(x[r], y[r]);
    const z = (measured - mean[r]) / sigma;
    const sound = -0.5 * z * z - Math.log(sigma) - LOG_ROOT_2PI;
    log += Math.max(sound, Math.log(SETTINGS.slipChance) + logWide);
  }
  return log;
}

/**
 * Screens every pair of faults on different parts with a quick score, so that two faults that only
 * make sense together are found although neither looks likely alone.
 *
 * @param versionsFor versions of an atom, as `versionsOf` finds them.
 * @param known sets already scored; their pairs are left out.
 * @returns pairs by falling estimate.
 */
export function screenPairs(
  scorer: Scorer,
  atoms: readonly Atom[],
  versionsFor: (atom: Atom) => Version[],
  priors: PriorModel,
  known: ReadonlyMap<string, ScoredSet>,
): ScreenedPair[] {
  const mean = new Float64Array(scorer.observations.length);
  const versions = atoms.map(versionsFor);
  const isHard = atoms.map(({ coarse }) => coarse.length === 1);
  const pairs: ScreenedPair[] = [];
  for (let i = 0; i < atoms.length; i += 1) {
    for (let j = i + 1; j < atoms.length; j += 1) {
      if (atoms[i].part === atoms[j].part) continue;
      const [left, right] = [atoms[i], atoms[j]];
      if (known.has(left.key < right.key ? `${left.key}|${right.key}` : `${right.key}|${left.key}`))
        continue;
      const isSoft = !isHard[i] && !isHard[j];
      const lefts = isSoft ? versions[i].slice(0, BEST_VERSIONS) : versions[i];
      const rights = isSoft ? versions[j].slice(0, BEST_VERSIONS) : versions[j];
      let best: [SettledFault, SettledFault] | null = null;
      let bestLog = -Infinity;
      const logs: number[] = [];
      for (const x of lefts) {
        for (const y of rights) {
          if (!scorer.means([x.cell.fault, y.cell.fault], mean)) continue;
          const log = x.cell.logShare + y.cell.logShare + roughLog(scorer, mean, x.sigma, y.sigma);
          logs.push(log);
          if (log > bestLog) {
            bestLog = log;
            best = [x.cell.fault, y.cell.fault];
          }
        }
      }
      if (!best) continue;
      const estimate = priors.of([left, right]).log + logSumExp(logs);
      pairs.push({ atoms: [left, right], start: best, estimate });
    }
  }
  return pairs.sort((x, y) => y.estimate - x.estimate);
}
