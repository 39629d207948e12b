import { nodeProblem, pointerStep } from './names';
import type { NetlistProblem } from './types';

export type JsonObject = Record<string, unknown>;

/** True for a JSON object, not for a list or null. */
export function isObject(value: unknown): value is JsonObject {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** Collects problems while a document is read, so that a person sees all of them at once. */
export class Reader {
  readonly problems: NetlistProblem[] = [];

  add(code: string, path: string, message: string, part?: string): void {
    this.problems.push({ code, message, path, ...(part === undefined ? {} : { part }) });
  }

  /** Refuses fields that the format does not know. */
  known(
    value: JsonObject,
    names: readonly string[],
    path: string,
    where: string,
    part?: string,
  ): void {
    for (const name of Object.keys(value)) {
      if (!names.includes(name)) {
        this.add(
          'unknown-field',
          `${path}/${pointerStep(name)}`,
          `${where} has a field “${name}” that the format does not know. Remove it or check its spelling.`,
          part,
        );
      }
    }
  }

  node(value: unknown, path: string, where: string, part?: string): void {
    const problem = nodeProblem(value, where);
    if (problem) this.add(problem.code, path, problem.message, part);
  }

  /** Refuses what is no number between two bounds. */
  between(value: unknown, least: number, most: number, path: string, where: string): void {
    if (typeof value !== 'number' || !(value >= least && value <= most)) {
      this.add('bad-value', path, `${where} must be a number from ${least} to ${most}.`);
    }
  }
}
