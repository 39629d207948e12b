import type { RuleChecker } from './checker';
import { factNamed, type FactDefinition } from './facts';

/** Comparisons of json-rules-engine that a rule may use, by type of the fact. */
export const OPERATORS: Readonly<Record<FactDefinition['type'], readonly string[]>> = {
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
/** Conditions may be nested this deep. */
const MOST_DEPTH = 3;
/** A list holds this many conditions at most. */
const MOST_CONDITIONS = 20;

function checkComparison(checker: RuleChecker, value: Record<string, unknown>, path: string): void {
  // Neither paths into a fact, nor parameters, nor priorities: nothing but the facts themselves.
  checker.known(value, ['fact', 'operator', 'value'], path);
  const { fact, operator } = value;
  const definition = factNamed(fact);
  if (!definition) {
    checker.add(
      'unknown-fact',
      `${path}/fact`,
      `“${String(fact)}” is no fact a rule may use. The facts are listed in rules/README.md.`,
    );
    return;
  }
  if (definition.scope === 'part' && !checker.hasPart) {
    checker.add(
      'fact-out-of-scope',
      `${path}/fact`,
      `“${String(fact)}” is about one part. The rule must be about each part, or each body, to use it.`,
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
  if (isList) {
    checker.words(value.value, `${path}/value`, `What “${String(fact)}” is compared with`);
    return;
  }
  const wanted = definition.type === 'text' ? 'string' : definition.type;
  const isRight =
    typeof value.value === wanted && (wanted !== 'number' || Number.isFinite(value.value));
  if (!isRight) {
    checker.add(
      'bad-value',
      `${path}/value`,
      `“${String(fact)}” must be compared with a ${definition.type}.`,
    );
  }
}

/** Checks a condition and all within it. */
export function checkCondition(checker: RuleChecker, json: unknown, path: string, depth = 0): void {
  const value = checker.object(json, 'bad-condition', path, 'A condition must be an object.');
  if (!value) return;
  const word = (['all', 'any', 'not'] as const).find((name) => Object.hasOwn(value, name));
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
  if (!Array.isArray(inner) || inner.length === 0 || inner.length > MOST_CONDITIONS) {
    checker.add(
      'bad-condition',
      `${path}/${word}`,
      `“${word}” must hold a list of 1 to ${MOST_CONDITIONS} conditions.`,
    );
    return;
  }
  inner.forEach((item, i) => checkCondition(checker, item, `${path}/${word}/${i}`, depth + 1));
}
