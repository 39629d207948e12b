import type { Reading } from '../netlist/types';
import { meterVariance, overChance } from '../ranking/likelihood';
import type { Ranked } from '../ranking/posterior';
import type { Scorer } from '../ranking/scorer';
import { type ReadingSpec, specOf } from '../solver/reading-spec';
import { type Candidate, listCandidates, placeOf } from './candidates';
import { conditionOn } from './conditional';

/** What a candidate would show under each suspect. */
export interface Outlook {
  mean: number;
  sigma: number;
  /** Chance of OL. */
  over: number;
  shown: number;
}

/** A candidate with what it would tell. */
export interface RatedCandidate extends Candidate {
  bits: number;
  /** Bits per minute, powered work counted dearer. */
  rate: number;
  /** Per suspect considered, in the order of `suspects`. */
  outlook: Outlook[];
}

/** Suspects that take part, and the least probability that counts. */
const MOST_SUSPECTS = 40;
const LEAST_PROBABILITY = 5e-4;
/** Getting a lead in place, and the further cost of working on a live set, minutes. Assumptions. */
const SETTLE_MINUTES = 0.5;
const LIVE_MINUTES = 0.3;

/** Five-point Gauss-Hermite rule for the standard normal (Abramowitz & Stegun, table 25.10). */
const NODES = [-2.8569700138728, -1.3556261799743, 0, 1.3556261799743, 2.8569700138728];
const WEIGHTS = [
  0.0112574113277, 0.2220759220056, 0.5333333333333, 0.2220759220056, 0.0112574113277,
];

/**
 * Mutual information in bits between the suspects and one reading: the expected drop in entropy
 * (J. de Kleer, B. C. Williams, Artificial Intelligence 32 (1987) 97-130), for normal readings that
 * may also go over range.
 */
export function gain(weights: readonly number[], outlook: readonly Outlook[]): number {
  const n = weights.length;
  let overAll = 0;
  for (let h = 0; h < n; h += 1) overAll += weights[h] * outlook[h].over;
  let bits = 0;
  for (let h = 0; h < n; h += 1) {
    const { mean, sigma, over } = outlook[h];
    if (over > 1e-9) bits += weights[h] * over * Math.log2(over / overAll);
    const under = 1 - over;
    if (under < 1e-6) continue;
    for (let q = 0; q < NODES.length; q += 1) {
      const x = mean + NODES[q] * sigma;
      const own = (under * Math.exp(-0.5 * NODES[q] * NODES[q])) / sigma;
      let mix = 0;
      for (let j = 0; j < n; j += 1) {
        const other = outlook[j];
        const z = (x - other.mean) / other.sigma;
        if (z > 7 || z < -7) continue;
        mix += (weights[j] * (1 - other.over) * Math.exp(-0.5 * z * z)) / other.sigma;
      }
      bits += weights[h] * under * WEIGHTS[q] * Math.log2(own / Math.max(mix, 1e-300));
    }
  }
  return Math.max(0, bits);
}

function isLive({ take }: Candidate): boolean {
  return take !== 'ohms' && take !== 'lifted-ohms';
}

/**
 * Rates every reading that could be taken by what it would tell about the suspects, per minute of
 * bench time.
 *
 * @param ranked suspects, best first.
 * @returns candidates, best first; `suspects` are the ones the outlooks refer to.
 */
export function rateCandidates(
  scorer: Scorer,
  ranked: readonly Ranked[],
): { candidates: RatedCandidate[]; suspects: Ranked[] } {
  const { circuit, readings } = scorer;
  const taken = new Set(readings.map((reading: Reading) => placeOf(reading)));
  const listed = listCandidates(scorer.predictor, taken).filter(({ take }) => take !== 'sign');
  const suspects = ranked
    .slice(0, MOST_SUSPECTS)
    .filter(({ probability }) => probability > LEAST_PROBABILITY);
  const total = suspects.reduce((sum, { probability }) => sum + probability, 0);
  const specs: ReadingSpec[] = listed.map((candidate) => specOf(circuit, candidate));
  const both = [...scorer.observations.map(({ spec }) => spec), ...specs];
  const outlooks: Outlook[][] = listed.map(() => []);
  const weights: number[] = [];
  const kept: Ranked[] = [];
  for (const suspect of suspects) {
    const predicted = conditionOn(scorer, suspect.set, both);
    if (!predicted) continue;
    kept.push(suspect);
    weights.push(suspect.probability / total);
    specs.forEach((spec, c) => {
      const { mean, variance, shown } = predicted[c];
      const own = meterVariance(spec, shown);
      outlooks[c].push({
        mean,
        sigma: Math.sqrt(variance + own),
        over: spec.isLog ? overChance(mean, Math.sqrt(variance), spec.meter.overOhms) : 0,
        shown,
      });
    });
  }
  const candidates = listed.map((candidate, c) => {
    const bits = gain(weights, outlooks[c]);
    const minutes = candidate.minutes + SETTLE_MINUTES + (isLive(candidate) ? LIVE_MINUTES : 0);
    return { ...candidate, bits, rate: bits / minutes, outlook: outlooks[c] };
  });
  candidates.sort((x, y) => y.rate - x.rate || (placeOf(x) < placeOf(y) ? -1 : 1));
  return { candidates, suspects: kept };
}
