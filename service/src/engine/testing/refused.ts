import { readFileSync } from 'node:fs';
import { join } from 'node:path';

const FOLDER = join(__dirname, '..', '..', '..', 'test', 'refused');

/** What the first problem of a broken file must be. */
export interface ExpectedRefusal {
  code: string;
  path?: string;
  part?: string;
  nodes?: string[];
  line?: number;
  column?: string;
  /** Words that the sentence must hold, so that a person finds the place. */
  names?: string[];
}

/** Broken files of one kind, each named for what is wrong with it, with what must be said. */
export function refusedFiles(
  kind: 'netlists' | 'csv' | 'rules',
): [name: string, text: string, expected: ExpectedRefusal][] {
  const read = (name: string) => readFileSync(join(FOLDER, kind, name), 'utf8');
  const expected = JSON.parse(read('expected.json')) as Record<string, ExpectedRefusal>;
  return Object.entries(expected).map(([name, refusal]) => [name, read(name), refusal]);
}

/** Expects a problem with these facts, said in a full sentence that holds these words. */
export function expectRefusal(problem: unknown, { names = [], ...facts }: ExpectedRefusal): void {
  expect(problem).toMatchObject(facts);
  const { message } = problem as { message: string };
  expect(message).toMatch(/^[“‘\p{Lu}].*[.?]$/su);
  for (const name of names) expect(message).toContain(name);
}
