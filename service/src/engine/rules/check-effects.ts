import { modesOf } from '../faults/modes';
import {
  FAULT_MODES,
  type FaultMode,
  type Part,
  PART_KINDS,
  type PartKind,
} from '../netlist/types';
import type { RuleChecker } from './checker';

const EFFECTS = ['speaks-for', 'speaks-against', 'cause', 'advice', 'caution'];
const SELECTOR = [
  'kind',
  'make',
  'ref',
  'assembly',
  'isPictureTube',
  'isThis',
  'isAcrossThis',
  'isInString',
];
const YES_OR_NO = ['isPictureTube', 'isThis', 'isAcrossThis', 'isInString'];
/** A rule that says more than this would be a diagnosis by itself. */
const MOST_FACTOR = 1000;

/** Kinds a checked selector can mean. */
function kindsMeant(checker: RuleChecker, selector: Record<string, unknown>): readonly PartKind[] {
  if (Array.isArray(selector.kind)) return selector.kind as PartKind[];
  if (selector.isPictureTube === true) return ['heater'];
  if (selector.isThis === true) return checker.kindsAtHand ?? PART_KINDS;
  return PART_KINDS;
}

function checkSelector(
  checker: RuleChecker,
  json: unknown,
  path: string,
): Record<string, unknown> | null {
  const wanted = 'Say which parts are meant: by kind, make, reference or body.';
  const value = checker.object(json, 'bad-selector', path, wanted);
  if (!value) return null;
  if (Object.keys(value).length === 0) {
    checker.add('bad-selector', path, wanted);
    return null;
  }
  const before = checker.problems.length;
  checker.known(value, SELECTOR, path);
  if (value.kind !== undefined) checker.kinds(value.kind, `${path}/kind`);
  if (value.make !== undefined) checker.words(value.make, `${path}/make`, 'Makes');
  if (value.ref !== undefined) checker.text(value.ref, `${path}/ref`, 'the part’s reference', 24);
  if (value.assembly !== undefined && value.assembly !== 'same' && value.assembly !== 'any') {
    checker.add('bad-selector', `${path}/assembly`, '“assembly” is “same” or “any”.');
  }
  for (const name of YES_OR_NO) {
    if (value[name] !== undefined && typeof value[name] !== 'boolean') {
      checker.add('bad-selector', `${path}/${name}`, `“${name}” is true or false.`);
    }
  }
  const needsPart =
    value.isThis === true || value.isAcrossThis === true || value.assembly === 'same';
  if (needsPart && !checker.hasPart) {
    checker.add(
      'selector-out-of-scope',
      path,
      'There is no part at hand: the rule must be about each part, or each body.',
    );
  }
  if (checker.isAboutBodies && (value.isThis === true || value.isAcrossThis === true)) {
    checker.add(
      'selector-out-of-scope',
      path,
      'A rule about each body means its sections: write “assembly”: “same”.',
    );
  }
  return checker.problems.length === before ? value : null;
}

/** Checks which parts an effect concerns and how they fail; some part must be able to fail so. */
function checkFault(
  checker: RuleChecker,
  { parts, mode }: Record<string, unknown>,
  path: string,
): void {
  const selector = checkSelector(checker, parts, `${path}/parts`);
  if (!FAULT_MODES.includes(mode as FaultMode)) {
    checker.add(
      'unknown-mode',
      `${path}/mode`,
      `“${String(mode)}” is no way a part fails. Ways are ${FAULT_MODES.join(', ')}.`,
    );
    return;
  }
  if (!selector) return;
  const kinds = kindsMeant(checker, selector);
  // A cathode is named so that a heater's leak to it counts.
  const canFail = kinds.some((kind) =>
    modesOf({ kind, cathode: 'K' } as Part).includes(mode as FaultMode),
  );
  if (!canFail) {
    checker.add(
      'mode-does-not-fit',
      `${path}/mode`,
      `No ${kinds.join(' or ')} fails by being “${String(mode)}”.`,
    );
  }
}

function checkCause(checker: RuleChecker, value: Record<string, unknown>, path: string): void {
  checker.known(value, ['effect', 'name', 'probability', 'members'], path);
  checker.text(value.name, `${path}/name`, 'a name for the cause', 80);
  checker.chance(value.probability, `${path}/probability`);
  if (!Array.isArray(value.members) || value.members.length === 0 || value.members.length > 20) {
    checker.add(
      'no-members',
      `${path}/members`,
      'A cause needs a list of the faults it ties together, 20 at most.',
    );
    return;
  }
  value.members.forEach((json: unknown, i) => {
    const at = `${path}/members/${i}`;
    const member = checker.object(json, 'bad-member', at, 'A member must be an object.');
    if (!member) return;
    checker.known(member, ['parts', 'mode', 'probability'], at);
    checkFault(checker, member, at);
    checker.chance(member.probability, `${at}/probability`);
  });
}

/** Checks one effect of a rule. */
export function checkEffect(checker: RuleChecker, json: unknown, path: string): void {
  const value = checker.object(json, 'unknown-effect', path, 'An effect must be an object.');
  if (!value) return;
  switch (value.effect) {
    case 'advice':
    case 'caution':
      checker.known(value, ['effect', 'text'], path);
      checker.text(value.text, `${path}/text`, 'the words to say');
      return;
    case 'cause':
      checkCause(checker, value, path);
      return;
    case 'speaks-for':
    case 'speaks-against': {
      checker.known(value, ['effect', 'parts', 'mode', 'factor'], path);
      checkFault(checker, value, path);
      const { factor } = value;
      if (typeof factor !== 'number' || !(factor > 1 && factor <= MOST_FACTOR)) {
        checker.add(
          'bad-factor',
          `${path}/factor`,
          `A factor says how many times likelier or less likely: more than 1, at most ${MOST_FACTOR}.`,
        );
      }
      return;
    }
    default:
      checker.add('unknown-effect', `${path}/effect`, `An effect is one of ${EFFECTS.join(', ')}.`);
  }
}
