import type { Fault, ReadingEvidence, RuleVoice } from '../diagnosis-types';
import type { Reading } from '../netlist/types';
import { readingWords, shownWords, suspectTitle, timesWords } from './words';

/** What the sentences need to know of the case. */
export interface ReasonContext {
  readings: readonly Reading[];
  healthy: readonly ReadingEvidence[];
  labelOf: (node: string) => string;
  black: string;
}

function measuredWords({ value, take }: Reading): string {
  return value === 'OL' ? 'OL' : shownWords(typeof value === 'number' ? value : null, take);
}

function upperFirst(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/**
 * Full sentences that say why a suspect stands where it stands: the readings that speak most for
 * it, the one that speaks most against it, and those it can only explain as slips.
 */
export function reasonsFor(
  faults: readonly Fault[],
  evidence: readonly ReadingEvidence[],
  rules: readonly RuleVoice[],
  context: ReasonContext,
): string[] {
  const { readings, healthy, labelOf, black } = context;
  const name = (index: number) => upperFirst(readingWords(readings[index], labelOf, black));
  const out: string[] = [];
  if (faults.length === 0) {
    const odd = evidence.filter(({ slip }) => slip);
    if (odd.length === 0) out.push('Every reading lies where a healthy set would show it.');
    for (const { reading, predicted } of odd) {
      out.push(
        `${name(reading)} reads ${measuredWords(readings[reading])}; a healthy set shows ${shownWords(predicted, readings[reading].take)}.`,
      );
    }
    return out;
  }
  const title = suspectTitle(faults);
  const telling = [...evidence].sort(
    (x, y) => Math.abs(Math.log(y.times)) - Math.abs(Math.log(x.times)),
  );
  const forIt = telling.filter(({ times, slip }) => times >= 1.5 && !slip).slice(0, 3);
  const against = telling.filter(({ times, slip }) => times <= 1 / 1.5 && !slip).slice(0, 1);
  for (const { reading, times, predicted } of forIt) {
    const normal = healthy.find((other) => other.reading === reading);
    out.push(
      `${name(reading)} reads ${measuredWords(readings[reading])} where a healthy set shows ${shownWords(normal?.predicted ?? null, readings[reading].take)}; with ${title} it would be ${shownWords(predicted, readings[reading].take)}: ${timesWords(times)}.`,
    );
  }
  for (const { reading, times, predicted } of against) {
    out.push(
      `Against it: ${readingWords(readings[reading], labelOf, black)} reads ${measuredWords(readings[reading])}, and it would be ${shownWords(predicted, readings[reading].take)}: ${timesWords(times)} than in a healthy set.`,
    );
  }
  for (const { reading } of evidence.filter(({ slip }) => slip).slice(0, 2)) {
    out.push(`${name(reading)} could only be a slip if this is the fault.`);
  }
  if (out.length === 0) {
    out.push('No reading so far would show this fault; it is possible, but nothing speaks for it.');
  }
  for (const { effect, because } of rules) {
    if (effect !== 'cause') continue;
    out.push(`One cause would explain these together: ${because}`);
  }
  return out;
}
