import type { AsFound, FaultMode, Part } from '../netlist/types';
import { priorOdds } from './failure-rates';

/** What moves prior odds away from the published rates. */
export interface OddsSources {
  /** Factors of rules that spoke, several per part and mode allowed. */
  factors: readonly { part: string; mode: FaultMode; factor: number }[];
  /** Solved cases of the chassis family. */
  solved?: { cases: number; faults: { part: string; mode: FaultMode; count: number }[] };
}

/**
 * Weight of the published rates in cases: a family's own cases move the odds once they are a few,
 * and decide them when they are many (Dirichlet counts).
 */
const PRIOR_CASES = 8;

/** Odds from published rates and a family's counts: (α·p + n)/(α + N − …) as odds. */
function withFamily(odds: number, count: number, cases: number): number {
  const p = odds / (1 + odds);
  const updated = (PRIOR_CASES * p + count) / (PRIOR_CASES + cases);
  const capped = Math.min(updated, 0.9);
  return capped / (1 - capped);
}

/**
 * Prior odds of a part and mode: published rate × share of the mode, moved by the family's solved
 * cases and by the factors of rules. What was recorded as found is certain and no suspect: a part
 * fitted, bridged or missing is left out in the mode that says so.
 */
export function makeOdds(
  { factors, solved }: OddsSources,
  asFound: readonly AsFound[],
): (part: Part, mode: FaultMode) => number {
  const byPart = new Map<string, Map<FaultMode, number>>();
  const certain = new Map<string, string>();
  for (const change of asFound) if ('part' in change) certain.set(change.part, change.change);
  return (part, mode) => {
    const found = certain.get(part.ref);
    if (found === 'bridged' || found === 'missing') return 0;
    let odds = byPart.get(part.ref);
    if (!odds) {
      odds = new Map(priorOdds(part).map((entry) => [entry.mode, entry.odds]));
      byPart.set(part.ref, odds);
    }
    let value = odds.get(mode) ?? 0;
    if (solved && solved.cases > 0) {
      const seen = solved.faults.find((fault) => fault.part === part.ref && fault.mode === mode);
      value = withFamily(value, seen?.count ?? 0, solved.cases);
    }
    for (const { part: ref, mode: own, factor } of factors) {
      if (ref === part.ref && own === mode) value *= factor;
    }
    return value;
  };
}
