import type { Netlist } from '../netlist/types';
import type { Ranked } from '../ranking/posterior';
import type { ReasonContext } from './reasons';
import { readingWords } from './words';

/** What is to be said about a ranking as a whole. */
export interface Remarks {
  remarks: string[];
  /** Readings that all good suspects call unlikely. */
  retake: number[];
  noneOfThese: boolean;
}

/** Suspects that count as good, and the part of the readings the best may call slips. */
const GOOD_SHARE = 0.9;
const MOST_SLIPS = 0.2;

/** Parts that no reading has touched so far, by ref; told when nothing seems wrong. */
function untested(netlist: Netlist, context: ReasonContext): string[] {
  const touched = new Set<string>();
  const nodes = new Set<string>();
  for (const { part, at } of context.readings) {
    if (part) touched.add(part);
    at?.forEach((node) => nodes.add(node));
  }
  return netlist.parts
    .filter(({ ref, between }) => !touched.has(ref) && !between.some((node) => nodes.has(node)))
    .map(({ ref }) => ref);
}

/**
 * Sentences about the whole: readings to take again, readings nothing explains, what is untested.
 *
 * @param groups group numbers of the suspects told, first suspect's group is 1.
 */
export function remarksFor(
  ranked: readonly Ranked[],
  groups: readonly number[],
  context: ReasonContext,
  netlist: Netlist,
): Remarks {
  const { readings, labelOf, black } = context;
  const remarks: string[] = [];
  const good: Ranked[] = [];
  let sum = 0;
  for (const suspect of ranked) {
    good.push(suspect);
    sum += suspect.probability;
    if (sum >= GOOD_SHARE || good.length >= 20) break;
  }
  const retake = readings
    .map((_, r) => r)
    .filter((r) => good.every(({ set }) => set.bestLikelihood.slips[r] === 1));
  const best = ranked[0].set;
  const allowed = Math.max(1, Math.floor(readings.length * MOST_SLIPS));
  const noneOfThese = best.bestLikelihood.slipCount > allowed;
  const name = (r: number) => readingWords(readings[r], labelOf, black);
  if (noneOfThese) {
    const odd = readings.map((_, r) => r).filter((r) => best.bestLikelihood.slips[r]);
    remarks.push(
      `None of these explains the readings well. Not explained: ${odd.map(name).join('; ')}. Check the circuit against the set, and take these again.`,
    );
  } else {
    for (const r of retake) {
      remarks.push(`Take this one again: ${name(r)}. No good suspect would show it.`);
    }
  }
  const first = groups.filter((group) => group === 1).length;
  if (first > 1 && best.atoms.length > 0) {
    remarks.push(
      `The readings so far cannot tell the first ${first} suspects apart; the next reading can.`,
    );
  }
  if (best.atoms.length === 0) {
    const parts = untested(netlist, context);
    if (parts.length > 0) {
      remarks.push(`Not tested yet by any reading at or beside it: ${parts.join(', ')}.`);
    }
  }
  return { remarks, retake, noneOfThese };
}
