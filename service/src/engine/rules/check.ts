import type { NetlistProblem, PartKind } from '../netlist/types';
import { checkCondition } from './check-conditions';
import { checkEffect } from './check-effects';
import { RuleChecker } from './checker';

const TOP = ['$schema', 'id', 'name', 'sentence', 'about', 'when', 'then', 'because', 'source'];
const SCOPES = ['case', 'each-part', 'each-body'];
const STATUSES = ['confirmed', 'from memory', 'common practice'];
const MOST_EFFECTS = 20;

function checkSource(checker: RuleChecker, json: unknown): void {
  const source = checker.object(
    json,
    'bad-source',
    '/source',
    'A source needs a title and a status.',
  );
  if (!source) return;
  checker.known(source, ['title', 'status'], '/source');
  checker.text(source.title, '/source/title', 'the source’s title', 300);
  if (!STATUSES.includes(source.status as string)) {
    checker.add(
      'bad-source',
      '/source/status',
      'A source is “confirmed”, “from memory” or “common practice”.',
    );
  }
}

/** Checks what the rule is about; what follows is checked in its light. */
function checkAbout(checker: RuleChecker, json: unknown): void {
  const wanted = 'A rule is about the case, about each part, or about each body.';
  const about = checker.object(json, 'bad-scope', '/about', wanted);
  if (!about) return;
  if (!SCOPES.includes(about.scope as string)) {
    checker.add('bad-scope', '/about/scope', wanted);
    return;
  }
  checker.hasPart = about.scope !== 'case';
  checker.isAboutBodies = about.scope === 'each-body';
  checker.known(about, checker.hasPart ? ['scope', 'kind'] : ['scope'], '/about');
  if (about.kind === undefined || !checker.hasPart) return;
  const before = checker.problems.length;
  checker.kinds(about.kind, '/about/kind');
  if (checker.problems.length === before) checker.kindsAtHand = about.kind as PartKind[];
}

/**
 * Checks a rule as it stands in a file. It can reach nothing but the documented facts: no paths, no
 * patterns, no functions.
 *
 * @param json anything, as parsed from JSON.
 * @returns every problem with a pointer into the rule; empty when the rule can be used.
 */
export function checkRule(json: unknown): NetlistProblem[] {
  const checker = new RuleChecker();
  const rule = checker.object(
    json,
    'not-a-rule',
    '',
    'A rule is a JSON object with id, name, about, when, then and because.',
  );
  if (!rule) return checker.problems;
  checker.known(rule, TOP, '');
  const { id, when, then } = rule;
  if (typeof id !== 'string' || !/^[a-z0-9]+(-[a-z0-9]+)*$/.test(id) || id.length > 60) {
    checker.add('bad-id', '/id', 'A rule needs an id of small letters, digits and dashes.');
  }
  checker.text(rule.name, '/name', 'a name', 120);
  checker.text(rule.sentence, '/sentence', 'the rule said as a sentence');
  checker.text(rule.because, '/because', 'a reason');
  if (rule.source !== undefined) checkSource(checker, rule.source);
  checkAbout(checker, rule.about);
  const conditions = checker.object(
    when,
    'bad-condition',
    '/when',
    'The conditions must begin with all, any or not.',
  );
  if (conditions) {
    if (['all', 'any', 'not'].some((word) => Object.hasOwn(conditions, word))) {
      checkCondition(checker, conditions, '/when');
    } else {
      checker.add('bad-condition', '/when', 'The conditions must begin with all, any or not.');
    }
  }
  if (!Array.isArray(then) || then.length === 0 || then.length > MOST_EFFECTS) {
    checker.add('no-effect', '/then', `A rule needs 1 to ${MOST_EFFECTS} effects.`);
  } else then.forEach((effect, i) => checkEffect(checker, effect, `/then/${i}`));
  return checker.problems;
}
