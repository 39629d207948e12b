import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import Ajv2020 from 'ajv/dist/2020';
import { FAULT_MODES, PART_KINDS } from '../netlist/types';
import { expectRefusal, refusedFiles } from '../testing/refused';
import { checkRule } from './check';
import { OPERATORS } from './check-conditions';
import { FACTS } from './facts';

const FOLDER = join(__dirname, '..', '..', '..', '..', 'rules');
const read = (...path: string[]) => readFileSync(join(FOLDER, ...path), 'utf8');
const SHIPPED = readdirSync(FOLDER, { withFileTypes: true })
  .filter((entry) => entry.isDirectory())
  .flatMap(({ name: pack }) => readdirSync(join(FOLDER, pack)).map((name) => `${pack}/${name}`));
const schema = JSON.parse(read('rule.schema.json')) as Record<string, never>;
const validate = new Ajv2020({ strict: false }).compile(schema);

/** Every list of words that the schema allows at places of this name. */
function enumsOf(node: unknown, name: string, parent = ''): string[][] {
  if (typeof node !== 'object' || node === null) return [];
  const own = (node as { enum?: string[] }).enum;
  return [
    ...(own && parent === name ? [own] : []),
    ...Object.entries(node).flatMap(([key, inner]) =>
      enumsOf(inner, name, key === 'items' ? parent : key),
    ),
  ];
}

describe('rules that ship with the project', () => {
  it.each(SHIPPED)('%s passes the check and the schema', (name) => {
    const rule = JSON.parse(read(name)) as { id: string };
    expect(checkRule(rule)).toEqual([]);
    expect(validate(rule)).toBe(true);
    expect(name.endsWith(`/${rule.id}.json`)).toBe(true);
  });
});

describe('rules that are refused', () => {
  it.each(refusedFiles('rules'))('%s', (_name, text, expected) => {
    expectRefusal(checkRule(JSON.parse(text))[0], expected);
  });

  it('are told with every problem at once', () => {
    expect(checkRule({ id: 'x' }).map(({ path }) => path)).toEqual([
      '/name',
      '/sentence',
      '/because',
      '/about',
      '/when',
      '/then',
    ]);
  });
});

describe('the schema and the book of facts', () => {
  it.each([
    ['fact', Object.keys(FACTS)],
    ['operator', [...new Set(Object.values(OPERATORS).flat())]],
    ['mode', FAULT_MODES],
    ['kind', PART_KINDS],
  ])('know the same words for a %s', (name, words) => {
    const lists = enumsOf(schema, name);
    expect(lists.length).toBeGreaterThan(0);
    for (const list of lists) expect([...list].sort()).toEqual([...words].sort());
  });

  it('are shown in the README by a rule that passes', () => {
    const [, example] = /```json\n([\s\S]*?)```/.exec(read('README.md'))!;
    expect(checkRule(JSON.parse(example))).toEqual([]);
  });

  it('name every fact with its unit in the README', () => {
    const readme = read('README.md');
    for (const [name, { unit }] of Object.entries(FACTS)) {
      const row = readme.split('\n').find((line) => line.startsWith(`| \`${name}\` `));
      expect(row ?? `no row for ${name}`).toContain(unit ?? '|');
    }
  });
});
