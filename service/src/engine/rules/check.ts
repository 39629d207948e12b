import {
  FAULT_MODES,
  type FaultMode,
  type NetlistProblem,
  PART_KINDS,
  type PartKind,
} from '../netlist/types';
import { FACTS } from './facts';

/** Comparisons of json-rules-engine that a rule may use, by type of the fact. */
export const OPERATORS: Record<'number' | 'boolean' | 'text', readonly string[]> = {
  number: [
    'equal',
    'notEqual',
    'lessThan',
    'lessThanInclusive',
    'greaterThan',
    'greaterThanInclusive',
  ],
  boolean: ['equal', 'notEqual'],
  text: ['equal', 'notEqual', 'in', 'notIn'],
};
const EFFECTS = ['speaks-for', 'speaks-against', 'cause', 'advice', 'caution'];
const TOP = ['$schema', 'id', 'name', 'sentence', 'about', 'when', 'then', 'because', 'source'];
const SELECTOR = ['kind', 'make', 'ref', 'assembly', 'isPictureTube', 'isThis', 'isInString'];
/** Conditions may be nested this deep. */
const MOST_DEPTH = 3;
const MOST_FACTOR = 1000;

type Json = Record<string, unknown>;

function isRecord(value: unknown): value is Json {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** Collects what is wrong with a rule. */
class Checker {
  readonly problems: NetlistProblem[] = [];
  /** Whether facts and selectors about one part make sense. */
  isAboutParts = false;

  add(code: string, path: string, message: string): void {
    this.problems.push({ code, path, message });
  }

  text(value: unknown, path: string, what: string, most = 600): void {
    if (typeof value !== 'string' || value.trim() === '' || value.length > most) {
      this.add('text-needed', path, `The rule needs ${what}: a text of 1 to ${most} characters.`);
    }
  }

  known(value: Json, names: readonly string[], path: string): void {
    for (const name of Object.keys(value)) {
      if (!names.includes(name)) {
        this.add(
          'unknown-field',
          `${path}/${name}`,
          `“${name}” is no field of a rule here. Remove it or check its spelling.`,
        );
      }
    }
  }

  chance(value: unknown, path: string): void {
    if (typeof value !== 'number' || !(value > 0 && value < 1)) {
      this.add('bad-probability', path, 'A probability must lie between 0 and 1.');
    }
  }

  kinds(value: unknown, path: string): void {
    if (!Array.isArray(value) || value.length === 0) {
      this.add('bad-kind', path, 'Kinds of part must be a list with at least one kind.');
      return;
    }
    for (const kind of value) {
      if (!PART_KINDS.includes(kind as PartKind)) {
        this.add(
          'unknown-kind',
          path,
          `“${String(kind)}” is no kind of part. Kinds are ${PART_KINDS.join(', ')}.`,
        );
      }
    }
  }
}

function checkComparison(checker: Checker, value: Json, path: string): void {
  checker.known(value, ['fact', 'operator', 'value'], path);
  const { fact, operator } = value;
  const definition =
    typeof fact === 'string' && Object.hasOwn(FACTS, fact) ? FACTS[fact] : undefined;
  if (!definition) {
    checker.add(
      'unknown-fact',
      `${path}/fact`,
      `“${String(fact)}” is no fact a rule may use. The facts are listed in rules/README.md.`,
    );
    return;
  }
  if (definition.scope === 'part' && !checker.isAboutParts) {
    checker.add(
      'fact-out-of-scope',
      `${path}/fact`,
      `“${String(fact)}” is about one part; the rule must be about each part to use it.`,
    );
  }
  if (!OPERATORS[definition.type].includes(operator as string)) {
    checker.add(
      'unknown-operator',
      `${path}/operator`,
      `“${String(operator)}” cannot compare “${String(fact)}”. Use one of ${OPERATORS[definition.type].join(', ')}.`,
    );
    return;
  }
  const isList = operator === 'in' || operator === 'notIn';
  const wanted = definition.type === 'text' ? 'string' : definition.type;
  const values = isList && Array.isArray(value.value) ? value.value : [value.value];
  if (values.some((item) => typeof item !== wanted) || (isList && !Array.isArray(value.value))) {
    checker.add(
      'bad-value',
      `${path}/value`,
      `“${String(fact)}” must be compared with a ${definition.type}${isList ? ' list' : ''}.`,
    );
  }
}

function checkCondition(checker: Checker, value: unknown, path: string, depth: number): void {
  if (!isRecord(value)) {
    checker.add('bad-condition', path, 'A condition must be an object.');
    return;
  }
  const word = (['all', 'any', 'not'] as const).find((name) => name in value);
  if (!word) {
    checkComparison(checker, value, path);
    return;
  }
  checker.known(value, [word], path);
  if (depth >= MOST_DEPTH) {
    checker.add('too-deep', path, 'Conditions may be nested two deep.');
    return;
  }
  const inner = value[word];
  if (word === 'not') {
    checkCondition(checker, inner, `${path}/not`, depth + 1);
    return;
  }
  if (!Array.isArray(inner)) {
    checker.add('bad-condition', `${path}/${word}`, `“${word}” must hold a list of conditions.`);
    return;
  }
  inner.forEach((item, i) => checkCondition(checker, item, `${path}/${word}/${i}`, depth + 1));
}

function checkSelector(checker: Checker, value: unknown, path: string): void {
  if (!isRecord(value) || Object.keys(value).length === 0) {
    checker.add(
      'bad-selector',
      path,
      'Say which parts are meant: by kind, make, reference or body.',
    );
    return;
  }
  checker.known(value, SELECTOR, path);
  if (value.kind !== undefined) checker.kinds(value.kind, `${path}/kind`);
  if ((value.isThis === true || value.assembly === 'same') && !checker.isAboutParts) {
    checker.add(
      'selector-out-of-scope',
      path,
      'There is no part at hand: the rule must be about each part.',
    );
  }
}

function checkMode(checker: Checker, value: unknown, path: string): void {
  if (!FAULT_MODES.includes(value as FaultMode)) {
    checker.add(
      'unknown-mode',
      path,
      `“${String(value)}” is no way a part fails. Ways are ${FAULT_MODES.join(', ')}.`,
    );
  }
}

function checkEffect(checker: Checker, value: unknown, path: string): void {
  if (!isRecord(value) || !EFFECTS.includes(value.effect as string)) {
    checker.add('unknown-effect', `${path}/effect`, `An effect is one of ${EFFECTS.join(', ')}.`);
    return;
  }
  if (value.effect === 'advice' || value.effect === 'caution') {
    checker.known(value, ['effect', 'text'], path);
    checker.text(value.text, `${path}/text`, 'the words to say');
    return;
  }
  if (value.effect === 'cause') {
    checker.known(value, ['effect', 'name', 'probability', 'members'], path);
    checker.text(value.name, `${path}/name`, 'a name for the cause', 80);
    checker.chance(value.probability, `${path}/probability`);
    if (!Array.isArray(value.members) || value.members.length === 0) {
      checker.add('no-members', `${path}/members`, 'A cause needs the faults it ties together.');
      return;
    }
    value.members.forEach((member: unknown, i) => {
      const at = `${path}/members/${i}`;
      if (!isRecord(member)) return checker.add('bad-member', at, 'A member must be an object.');
      checker.known(member, ['parts', 'mode', 'probability'], at);
      checkSelector(checker, member.parts, `${at}/parts`);
      checkMode(checker, member.mode, `${at}/mode`);
      checker.chance(member.probability, `${at}/probability`);
    });
    return;
  }
  checker.known(value, ['effect', 'parts', 'mode', 'factor'], path);
  checkSelector(checker, value.parts, `${path}/parts`);
  checkMode(checker, value.mode, `${path}/mode`);
  const { factor } = value;
  if (typeof factor !== 'number' || !(factor > 1 && factor <= MOST_FACTOR)) {
    checker.add(
      'bad-factor',
      `${path}/factor`,
      `A factor says how many times likelier or less likely: more than 1, at most ${MOST_FACTOR}.`,
    );
  }
}

/**
 * Checks a rule as it stands in a file. It can reach nothing but the documented facts: no paths, no
 * patterns, no functions.
 *
 * @param json anything, as parsed from JSON.
 * @returns every problem with a pointer into the rule; empty when the rule can be used.
 */
export function checkRule(json: unknown): NetlistProblem[] {
  const checker = new Checker();
  if (!isRecord(json)) {
    checker.add(
      'not-a-rule',
      '',
      'A rule is a JSON object with id, name, about, when, then and because.',
    );
    return checker.problems;
  }
  checker.known(json, TOP, '');
  if (
    typeof json.id !== 'string' ||
    !/^[a-z0-9]+(-[a-z0-9]+)*$/.test(json.id) ||
    json.id.length > 60
  ) {
    checker.add('bad-id', '/id', 'A rule needs an id of small letters, digits and dashes.');
  }
  checker.text(json.name, '/name', 'a name', 120);
  checker.text(json.sentence, '/sentence', 'the rule said as a sentence');
  checker.text(json.because, '/because', 'a reason');
  if (json.source !== undefined) {
    if (!isRecord(json.source))
      checker.add('bad-source', '/source', 'A source needs a title and a status.');
    else {
      checker.known(json.source, ['title', 'status'], '/source');
      checker.text(json.source.title, '/source/title', 'the source’s title', 300);
      if (!['confirmed', 'from memory', 'common practice'].includes(json.source.status as string)) {
        checker.add(
          'bad-source',
          '/source/status',
          'A source is “confirmed”, “from memory” or “common practice”.',
        );
      }
    }
  }
  const about = json.about;
  if (!isRecord(about) || (about.scope !== 'case' && about.scope !== 'each-part')) {
    checker.add('bad-scope', '/about', 'A rule is about the case or about each part.');
  } else {
    checker.known(about, ['scope', 'kind'], '/about');
    checker.isAboutParts = about.scope === 'each-part';
    if (about.kind !== undefined) checker.kinds(about.kind, '/about/kind');
  }
  if (!isRecord(json.when) || !('all' in json.when || 'any' in json.when || 'not' in json.when)) {
    checker.add('bad-condition', '/when', 'The conditions must begin with all, any or not.');
  } else checkCondition(checker, json.when, '/when', 0);
  if (!Array.isArray(json.then) || json.then.length === 0) {
    checker.add('no-effect', '/then', 'A rule needs at least one effect.');
  } else json.then.forEach((effect, i) => checkEffect(checker, effect, `/then/${i}`));
  return checker.problems;
}
