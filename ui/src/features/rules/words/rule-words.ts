import { formatQuantity, type Unit } from '@engine/units';
import { chanceInWords, timesInWords } from '@/lib/bench/chance';
import { KIND_WORDS } from '@/lib/bench/part-words';
import { FAULT_WORDS } from '@/lib/words';
import {
  type Comparison,
  type Condition,
  type PartSelector,
  type RuleEffect,
} from '../api/get-rule';
import { FACT_WORDS } from './fact-words';

const LIMITS: Record<string, string> = {
  equal: 'exactly',
  notEqual: 'other than',
  greaterThan: 'more than',
  greaterThanInclusive: 'at least',
  lessThan: 'less than',
  lessThanInclusive: 'at most',
};

/** Conditions that stand together, how they are joined, and lists inside the list. */
export interface ConditionList {
  /** Said before the list. */
  lead: string;
  items: (string | ConditionList)[];
}

/** Turns the conditions of a rule into sentences. */
export function conditionsInWords(condition: Condition): ConditionList {
  if ('all' in condition) return listOf('All of this is so:', condition.all);
  if ('any' in condition) return listOf('At least one of these is so:', condition.any);
  if ('not' in condition) return listOf('This is not so:', [condition.not]);
  return listOf('This is so:', [condition]);
}

function listOf(lead: string, conditions: readonly Condition[]): ConditionList {
  const items = conditions.map((one) =>
    'fact' in one ? comparisonInWords(one) : conditionsInWords(one),
  );
  return { lead, items };
}

/**
 * Says one comparison.
 *
 * @returns "The circuit has at least 2 dropper sections."; a fact without words of its own is named as it is.
 */
export function comparisonInWords({ fact, operator, value }: Comparison): string {
  const words = FACT_WORDS[fact];
  const limit = LIMITS[operator];
  const shown = Array.isArray(value) ? value.join(', ') : String(value);
  if (!words || !limit) return `“${fact}” ${limit ?? operator} ${shown}.`;
  if ('yes' in words) return (value === true) === (operator === 'equal') ? words.yes : words.no;
  if ('text' in words) {
    return words.text.replace('{v}', operator === 'equal' ? shown : `${limit} ${shown}`);
  }
  if ('count' in words) {
    const [one, many] = words.count;
    return words.frame.replace('{n}', `${limit} ${shown} ${value === 1 ? one : many}`);
  }
  const amount =
    typeof value !== 'number'
      ? shown
      : words.unit
        ? formatQuantity(value, words.unit as Unit, 3)
        : `${Math.round(value * 100)} %`;
  return words.measure.replace('{n}', `${limit} ${amount}`);
}

/** Names the parts that an effect concerns: "the part at hand", "a wirewound resistor". */
export function partsInWords(parts: PartSelector): string {
  if (parts.isThis) return 'the part at hand';
  if (parts.ref) return parts.ref;
  if (parts.isPictureTube) return 'the heater of a picture tube';
  const kinds = parts.kind?.map((kind) => KIND_WORDS[kind]).join(' or ') ?? 'part';
  const noun = [parts.make?.join(' or '), kinds].filter(Boolean).join(' ');
  const where = [
    parts.assembly === 'same' && 'in the same body',
    parts.assembly === 'any' && 'in a body of several sections',
    parts.isInString && 'in the heater string',
  ].filter(Boolean);
  return [`${/^[aeiou]/.test(noun) ? 'an' : 'a'} ${noun}`, ...where].join(' ');
}

/** What one effect does, as a sentence and what it ties together. */
export function effectInWords(effect: RuleEffect): { sentence: string; members: string[] } {
  if ('text' in effect) return { sentence: effect.text, members: [] };
  if (effect.effect === 'cause') {
    return {
      sentence: `“${effect.name}” ties faults together. It happened to ${chanceInWords(effect.probability)} sets that come in for repair, and then left:`,
      members: effect.members.map(
        ({ parts, mode, probability }) =>
          `${partsInWords(parts)}, ${FAULT_WORDS[mode]}, in ${chanceInWords(probability)} of them`,
      ),
    };
  }
  const times = effect.effect === 'speaks-for' ? effect.factor : 1 / effect.factor;
  const who = partsInWords(effect.parts);
  return {
    sentence: `It makes “${who}, ${FAULT_WORDS[effect.mode]}” ${timesInWords(times)}.`,
    members: [],
  };
}
