import {
  diagnose,
  type DiagnosisResult,
  EngineError,
  type Knowledge,
  type Reading,
} from '../src/engine';
import { type BenchCase, faultKey } from './cases';

/** Outcome of one case. */
export interface Outcome {
  id: string;
  circuit: string;
  kind: 'one-shot' | 'step';
  isHealthy: boolean;
  error?: string;
  ms: number;
  /** Rank of the true set, 0 for the first, −1 when it is not among the suspects. */
  rank: number;
  /** Probability given to the true set. */
  p: number;
  /** Probability of the first suspect. */
  firstP: number;
  partFirst: boolean;
  inFirstGroup: boolean;
  /** Rank of the best suspect that contains a true part, for single faults. */
  partRank: number;
  first: string;
  truth: string;
  /** Further readings taken, for step cases. */
  taken: number;
  /** Whether a reading asked for had no answer in the case. */
  isUnanswered: boolean;
}

/** Most further readings of a step case. */
const MOST_STEPS = 15;

function run(bench: BenchCase, readings: Reading[], knowledge: Knowledge) {
  const { netlist, conditions } = bench;
  return diagnose({ netlist, conditions, readings, knowledge });
}

/** Takes the first reading advised again and again, answered from the case, until settled. */
async function stepThrough(bench: BenchCase, knowledge: Knowledge) {
  const readings = bench.readings.slice();
  let result = await run(bench, readings, knowledge);
  let taken = 0;
  while (!result.settled && taken < MOST_STEPS && result.nextReadings.length > 0) {
    const { take, at, part } = result.nextReadings[0];
    const value = bench.answers![part ? `${take} ${part}` : `${take} ${at!.join(' ')}`];
    if (value === undefined) return { result, taken, isUnanswered: true };
    readings.push({ take, ...(at ? { at } : {}), ...(part ? { part } : {}), value });
    taken += 1;
    result = await run(bench, readings, knowledge);
  }
  return { result, taken, isUnanswered: false };
}

/** Runs one case and sets the result beside the truth. */
export async function judge(bench: BenchCase, knowledge: Knowledge): Promise<Outcome> {
  const truth = faultKey(bench.truth);
  const base = {
    id: bench.id,
    circuit: bench.circuit,
    kind: bench.answers ? ('step' as const) : ('one-shot' as const),
    isHealthy: bench.truth.length === 0,
    truth,
  };
  const start = performance.now();
  let result: DiagnosisResult;
  let taken = 0;
  let isUnanswered = false;
  try {
    if (bench.answers) {
      ({ result, taken, isUnanswered } = await stepThrough(bench, knowledge));
    } else result = await run(bench, bench.readings, knowledge);
  } catch (error) {
    const message = error instanceof EngineError ? error.message : String(error);
    return {
      ...base,
      error: message,
      ms: performance.now() - start,
      rank: -1,
      p: 1e-6,
      firstP: 0,
      partFirst: false,
      inFirstGroup: false,
      partRank: -1,
      first: '',
      taken,
      isUnanswered,
    };
  }
  const ms = (performance.now() - start) / (taken + 1);
  const rank = result.suspects.findIndex(({ faults }) => faultKey(faults) === truth);
  const truthParts = new Set(bench.truth.map(({ part }) => part));
  return {
    ...base,
    ms,
    rank,
    p: rank < 0 ? 1e-6 : Math.max(1e-6, result.suspects[rank].probability),
    firstP: result.suspects[0].probability,
    partFirst: truthParts.has(result.parts[0].part),
    inFirstGroup: rank >= 0 && result.suspects[rank].group === result.suspects[0].group,
    partRank: result.parts.findIndex(({ part }) => truthParts.has(part)),
    first: faultKey(result.suspects[0].faults),
    taken,
    isUnanswered,
  };
}

/** Scores over some cases; shares are between 0 and 1, NaN where there is nothing to count. */
export interface Scores {
  cases: number;
  partFirst: number;
  setFirst: number;
  setInThree: number;
  logLoss: number;
  healthy: number;
  /** Of the misses, how many have the true set in the first suspect's group. */
  missesInGroup: number;
  stepRight: number;
  stepReadings: number;
  errors: number;
  msMean: number;
  msMost: number;
  /** Expected calibration error of the first suspect's probability, ten bins. */
  calibration: number;
}

function share<T>(list: readonly T[], test: (item: T) => boolean): number {
  return list.filter(test).length / list.length;
}

function mean(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}

/** Bins of a reliability table: how often suspects of a stated probability were right. */
export function reliability(
  outcomes: readonly Outcome[],
): { from: number; to: number; count: number; stated: number; right: number }[] {
  const shots = outcomes.filter(({ kind, error }) => kind === 'one-shot' && !error);
  return Array.from({ length: 10 }, (_, i) => {
    const inBin = shots.filter(({ firstP }) => Math.min(9, Math.floor(firstP * 10)) === i);
    return {
      from: i / 10,
      to: (i + 1) / 10,
      count: inBin.length,
      stated: mean(inBin.map(({ firstP }) => firstP)),
      right: share(inBin, ({ rank }) => rank === 0),
    };
  });
}

/** The scores of a list of outcomes. */
export function scoresOf(outcomes: readonly Outcome[]): Scores {
  const shots = outcomes.filter(({ kind }) => kind === 'one-shot');
  const faulty = shots.filter(({ isHealthy }) => !isHealthy);
  const healthy = shots.filter(({ isHealthy }) => isHealthy);
  const steps = outcomes.filter(({ kind }) => kind === 'step');
  const misses = shots.filter(({ rank }) => rank !== 0);
  const bins = reliability(shots).filter(({ count }) => count > 0);
  return {
    cases: outcomes.length,
    partFirst: share(faulty, ({ partFirst }) => partFirst),
    setFirst: share(shots, ({ rank }) => rank === 0),
    setInThree: share(shots, ({ rank }) => rank >= 0 && rank < 3),
    logLoss: mean(shots.map(({ p }) => -Math.log(p))),
    healthy: share(healthy, ({ rank }) => rank === 0),
    missesInGroup: share(misses, ({ inFirstGroup }) => inFirstGroup),
    stepRight: share(steps, ({ rank }) => rank === 0),
    stepReadings: mean(steps.map(({ taken }) => taken)),
    errors: outcomes.filter(({ error }) => error).length,
    msMean: mean(shots.map(({ ms }) => ms)),
    msMost: Math.max(0, ...shots.map(({ ms }) => ms)),
    calibration: bins.reduce(
      (sum, { count, stated, right }) => sum + (count / shots.length) * Math.abs(stated - right),
      0,
    ),
  };
}
