import type { ReadingEvidence } from '../diagnosis-types';
import { meterVariance, overChance } from '../ranking/likelihood';
import type { ScoredSet } from '../ranking/fault-set';
import type { Scorer } from '../ranking/scorer';
import { SETTINGS } from '../tolerances';

/** One reading on its own under one suspect. */
export interface ReadingView {
  /** Volts, amps, or ln(ohms + offset). */
  mean: number;
  sigma: number;
  shown: number;
  /** Chance of OL. */
  over: number;
  /** ln of the density of what was measured, slips included. */
  log: number;
}

/** Every reading by itself under one suspect; null when the suspect does not settle. */
export function viewReadings(scorer: Scorer, set: ScoredSet): ReadingView[] | null {
  const { observations } = scorer;
  const predictions = scorer.predict(set.best, scorer.specs);
  if (!predictions) return null;
  const sigmas = scorer.sigmasOf(set.best);
  const { width, sensitivity, stray, mean, shown } = predictions;
  return observations.map(({ spec, y, isOver, logWide }, r) => {
    let variance = stray[r];
    for (let p = 0; p < width; p += 1) variance += (sensitivity[r * width + p] * sigmas[p]) ** 2;
    const spread = Math.sqrt(variance);
    const sigma = Math.sqrt(variance + meterVariance(spec, shown[r]));
    const over = spec.isLog ? overChance(mean[r], spread, spec.meter.overOhms) : 0;
    const slip = SETTINGS.slipChance;
    let log: number;
    if (spec.take === 'sign') log = 0;
    else if (isOver) log = Math.log((1 - slip) * over + slip * 0.2);
    else {
      const z = (y - mean[r]) / sigma;
      const density = Math.exp(-0.5 * z * z) / (sigma * Math.sqrt(2 * Math.PI));
      log = Math.log((1 - slip) * density * (1 - over) + slip * Math.exp(logWide));
    }
    return { mean: mean[r], sigma, shown: shown[r], over, log };
  });
}

/** Value a person would read for a position on the likelihood's scale. */
export function asShown(position: number, isLog: boolean): number {
  return Math.max(0, isLog ? Math.exp(position) - SETTINGS.ohmsOffset : position);
}

/** Sets a suspect's readings beside "nothing is wrong". */
export function evidenceOf(
  scorer: Scorer,
  set: ScoredSet,
  views: readonly ReadingView[],
  healthy: readonly ReadingView[],
): ReadingEvidence[] {
  return views.flatMap((view, reading): ReadingEvidence[] => {
    const { spec } = scorer.observations[reading];
    if (spec.take === 'sign') return [];
    const isOver = view.over > 0.5;
    return [
      {
        reading,
        predicted: isOver ? null : view.shown,
        ...(isOver
          ? {}
          : {
              low: asShown(view.mean - 1.96 * view.sigma, spec.isLog),
              high: asShown(view.mean + 1.96 * view.sigma, spec.isLog),
            }),
        times: Math.exp(Math.max(-30, Math.min(30, view.log - healthy[reading].log))),
        slip: set.bestLikelihood.slips[reading] === 1,
      },
    ];
  });
}
