import { type NextReading, type ReadingEvidence, type Suspect } from '@engine/diagnosis-types';
import { formatQuantity } from '@engine/units';
import { type CaseReading } from '@/lib/bench/case-reading';
import { timesInWords } from '@/lib/bench/chance';
import { computedInWords, intervalInWords } from '@/lib/bench/quantities';

/** Suspects side by side that the readings so far cannot tell apart. */
export interface SuspectGroup {
  group: number;
  suspects: Suspect[];
  probability: number;
}

/** Below this a suspect is only listed when asked for. */
export const SHOWN_FROM = 0.02;

/**
 * Puts suspects of one group together, in the order of the likeliest of each group.
 *
 * @param suspects ranked suspects.
 * @returns groups with the sum of their probabilities.
 */
export function groupsOf(suspects: readonly Suspect[]): SuspectGroup[] {
  const groups = new Map<number, SuspectGroup>();
  for (const suspect of suspects) {
    const group = groups.get(suspect.group);
    if (group) {
      group.suspects.push(suspect);
      group.probability += suspect.probability;
    } else {
      groups.set(suspect.group, {
        group: suspect.group,
        suspects: [suspect],
        probability: suspect.probability,
      });
    }
  }
  return [...groups.values()];
}

/**
 * Finds the suggested readings that would tell the members of a group apart.
 *
 * Those whose reason names two members; where there are none, those taken on a member.
 *
 * @returns at most two, best first.
 */
export function separatorsOf(
  group: SuspectGroup,
  nextReadings: readonly NextReading[],
): NextReading[] {
  const parts = group.suspects.map(({ faults }) => faults.map(({ part }) => part));
  const between = nextReadings.filter(
    ({ why }) => parts.filter((refs) => refs.some((ref) => names(why, ref))).length >= 2,
  );
  const onMember = nextReadings.filter(({ part }) => part && parts.flat().includes(part));
  return (between.length > 0 ? between : onMember).slice(0, 2);
}

function names(text: string, ref: string): boolean {
  return new RegExp(`(^|[^\\w-])${ref.replace(/[-_]/g, '\\$&')}([^\\w-]|$)`).test(text);
}

/**
 * Says what value a fault needs to explain the readings.
 *
 * @returns "about 9.4 times its usual value, between 6.2 and 18 times", "about 132 Ω, between 96 Ω and 210 Ω";
 *   null when the fault has no unknown value.
 */
export function neededValueInWords(fault: Suspect['faults'][number]): string | null {
  const { value, interval, valueUnit, volts, amps, types } = fault;
  if (volts !== undefined || amps !== undefined) {
    const rating = [
      volts === undefined ? '' : formatQuantity(volts, 'V'),
      amps === undefined ? '' : formatQuantity(amps, 'A'),
    ].filter(Boolean);
    const named = types?.length ? ` (${types.slice(0, 4).join(', ')})` : '';
    return `a rating of ${rating.join(', ')}${named}`;
  }
  if (value === undefined) return null;
  const write =
    valueUnit === 'ohms'
      ? (ohms: number) => formatQuantity(ohms, 'Ω')
      : (factor: number) => `${Number(factor.toPrecision(2))}`;
  const unit = valueUnit === 'ohms' ? '' : ' times';
  const centre = `about ${write(value)}${unit}${valueUnit === 'ohms' ? '' : ' its usual value'}`;
  if (!interval) return centre;
  return `${centre}, between ${write(interval[0])} and ${write(interval[1])}${unit}`;
}

/**
 * Says what a reading would show under a suspect.
 *
 * @returns "118 V (112 to 121 V)", "OL".
 */
export function wouldShowInWords(
  evidence: ReadingEvidence,
  reading: Pick<CaseReading, 'take'>,
): string {
  const centre = computedInWords(evidence.predicted, reading.take);
  if (evidence.predicted === null) return centre;
  if (evidence.low === undefined || evidence.high === undefined) return centre;
  const isNothing = computedInWords(evidence.high, reading.take) === centre;
  if (isNothing && computedInWords(evidence.low, reading.take) === centre) return centre;
  return `${centre} (${intervalInWords(evidence.low, evidence.high, reading.take)})`;
}

/** Says how a reading speaks: by how many times, or that only a slip would explain it. */
export function speaksInWords(evidence: ReadingEvidence): string {
  if (evidence.slip) return 'only as a slip of the reading';
  return timesInWords(evidence.times);
}

/** Says how a rule speaks: "speaks for it, 3 times", "ties the faults together". */
export function ruleEffectInWords(voice: Suspect['rules'][number]): string {
  if (voice.effect === 'cause') return 'ties these faults together';
  const verb = voice.effect === 'speaks-for' ? 'speaks for it' : 'speaks against it';
  return voice.factor === undefined ? verb : `${verb}: ${timesInWords(voice.factor)}`;
}

/** Names a rule by the words of its id: "lamp-reads-well-cold" is "Lamp reads well cold". */
export function ruleInWords(rule: string): string {
  const words = (rule.split('/').pop() ?? rule).replaceAll('-', ' ');
  return words.charAt(0).toUpperCase() + words.slice(1);
}
