import { pointerStep } from '../netlist/names';
import { isObject } from '../netlist/reader';
import { type NetlistProblem, PART_KINDS, type PartKind } from '../netlist/types';

/** Collects what is wrong with a rule, so that its author sees all of it at once. */
export class RuleChecker {
  readonly problems: NetlistProblem[] = [];
  /** The rule is asked with a part at hand: facts about one part make sense. */
  hasPart = false;
  /** The part at hand is one section that stands for its body. */
  isAboutBodies = false;
  /** Kinds of the part at hand; undefined when any may be. */
  kindsAtHand?: PartKind[];

  add(code: string, path: string, message: string): void {
    this.problems.push({ code, path, message });
  }

  text(value: unknown, path: string, what: string, most = 600): void {
    if (typeof value !== 'string' || value.trim() === '' || value.length > most) {
      this.add('text-needed', path, `The rule needs ${what}: a text of 1 to ${most} characters.`);
    }
  }

  known(value: Record<string, unknown>, names: readonly string[], path: string): void {
    for (const name of Object.keys(value)) {
      if (!names.includes(name)) {
        this.add(
          'unknown-field',
          `${path}/${pointerStep(name)}`,
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

  /** Checks a list of words; true when it is one. */
  words(value: unknown, path: string, what: string): value is string[] {
    const isList =
      Array.isArray(value) &&
      value.length > 0 &&
      value.length <= 50 &&
      value.every((word) => typeof word === 'string' && word !== '');
    if (!isList) {
      this.add('bad-list', path, `${what} must be a list of one or more words.`);
    }
    return isList;
  }

  kinds(value: unknown, path: string): void {
    if (!this.words(value, path, 'Kinds of part')) return;
    for (const kind of value) {
      if (!PART_KINDS.includes(kind as PartKind)) {
        this.add(
          'unknown-kind',
          path,
          `“${kind}” is no kind of part. Kinds are ${PART_KINDS.join(', ')}.`,
        );
      }
    }
  }

  /** The value as an object; null, with a problem told, when it is none. */
  object(
    value: unknown,
    code: string,
    path: string,
    message: string,
  ): Record<string, unknown> | null {
    if (isObject(value)) return value;
    this.add(code, path, message);
    return null;
  }
}
