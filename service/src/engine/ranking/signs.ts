import type { SettledFault } from '../faults/apply';
import type { Reading, Seen } from '../netlist/types';
import type { BranchValues } from '../solver/branch-values';
import type { Predictor } from '../solver/predictor';

/** Modes that leave a mark a person can see, by what is seen. Common practice. */
const MARKS: Partial<Record<Seen, readonly string[]>> = {
  burnt: ['open', 'high', 'bridged', 'overload', 'shorted'],
  cracked: ['open', 'high'],
  bulging: ['leaky', 'shorted', 'high-esr', 'low'],
  leaking: ['leaky', 'shorted', 'high-esr', 'low'],
};
/** Chance of a mark on a part that is bad in such a way, and on any other part. Assumptions. */
const MARK_IF_BAD = 0.35;
const MARK_OTHERWISE = 0.02;
/** Chance that a person judges a sign rightly. Assumption. */
const RIGHT = 0.97;
/** Share of rated volts at which a lamp or heater begins to be seen glowing; common practice. */
const GLOW_FROM = 0.35;

/** Probability that a lit part is seen glowing at this share of its rated volts. */
function glowChance(share: number): number {
  return 1 / (1 + Math.exp(-(share - GLOW_FROM) / 0.05));
}

/** Probability of one sign, given the share of rated volts (hot parts) and the part's own fault. */
function signChance(seen: Seen, share: number | null, mode: string | undefined): number {
  const marks = MARKS[seen];
  if (marks) return mode !== undefined && marks.includes(mode) ? MARK_IF_BAD : MARK_OTHERWISE;
  if (seen === 'looks-good') {
    const isMarked = mode !== undefined && Object.values(MARKS).some((m) => m.includes(mode));
    return isMarked ? 1 - MARK_IF_BAD : 1 - MARK_OTHERWISE;
  }
  if (share === null) return 0.5;
  const lit = glowChance(share);
  if (seen === 'glows' || seen === 'warm' || seen === 'hot')
    return RIGHT * lit + (1 - RIGHT) * (1 - lit);
  if (seen === 'dark' || seen === 'cold') return RIGHT * (1 - lit) + (1 - RIGHT) * lit;
  return 0.5;
}

/**
 * Log-likelihood of everything seen or heard: P(seen | volts, fault of the part).
 *
 * @param predictor holds the powered solution of this hypothesis, or solves it here.
 */
export function signLog(
  predictor: Predictor,
  values: BranchValues,
  faults: readonly SettledFault[],
  signs: readonly Reading[],
): number {
  const { circuit, rms } = predictor;
  if (!rms.solve(values)) return signs.length * Math.log(0.5);
  let log = 0;
  for (const { part, seen } of signs) {
    const k = part === undefined ? undefined : circuit.partIndex.get(part);
    if (k === undefined || seen === undefined) continue;
    const { a, b } = circuit.branches[k];
    const own = circuit.parts[k];
    const isHot = (own.kind === 'heater' || own.kind === 'lamp') && circuit.isSteady[k] === 1;
    const open = faults.find((fault) => fault.part === k);
    // An open or shorted part stays dark whatever its terminals show.
    const share = !isHot
      ? null
      : open && (open.mode === 'open' || open.mode === 'shorted')
        ? 0
        : Math.abs(rms.volts[a] - rms.volts[b]) / values.p0[k];
    log += Math.log(Math.max(signChance(seen, share, open?.mode), 1e-3));
  }
  return log;
}
