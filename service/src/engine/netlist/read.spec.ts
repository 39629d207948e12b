import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import Ajv2020 from 'ajv/dist/2020';
import { NetlistError } from '../errors';
import { series } from '../testing/circuits';
import { expectRefusal, refusedFiles } from '../testing/refused';
import { checkNetlist } from './checks';
import { MOST_PARTS, readNetlist } from './read';
import type { NetlistProblem } from './types';

const FOLDER = join(__dirname, '..', '..', '..', '..', 'netlists');
const SHIPPED = readdirSync(FOLDER).filter(
  (name) => name.endsWith('.json') && !['families.json', 'netlist.schema.json'].includes(name),
);

function json(name: string): unknown {
  return JSON.parse(readFileSync(join(FOLDER, name), 'utf8'));
}

/** Everything that reading and checking have to say about a document. */
function problemsOf(document: unknown): NetlistProblem[] {
  try {
    return checkNetlist(readNetlist(document));
  } catch (error) {
    if (error instanceof NetlistError) return error.problems;
    throw error;
  }
}

describe('circuits that ship with the project', () => {
  const validate = new Ajv2020({ strict: false }).compile(json('netlist.schema.json') as object);

  it('are described in families.json, each once', () => {
    expect(Object.keys(json('families.json') as object).sort()).toEqual([...SHIPPED].sort());
  });

  it.each(SHIPPED)('%s is read, makes sense and matches the schema', (name) => {
    expect(problemsOf(json(name))).toEqual([]);
    expect(validate(json(name))).toBe(true);
  });
});

describe('circuits that are refused', () => {
  it.each(refusedFiles('netlists'))('%s', (_name, text, expected) => {
    expectRefusal(problemsOf(JSON.parse(text))[0], expected);
  });

  it('are told with every problem at once', () => {
    const problems = problemsOf({ ohmstead: 2, title: '', reference: 'N', parts: [{}, 7] });
    expect(problems.map(({ code }) => code)).toEqual([
      'bad-version',
      'bad-title',
      'bad-ref',
      'unknown-kind',
      'bad-part',
    ]);
  });

  it('hold more parts than are taken', () => {
    const most = series(117, Array<number>(MOST_PARTS).fill(1));
    expect(problemsOf(most)).toEqual([]);
    const more = series(117, Array<number>(MOST_PARTS + 1).fill(1));
    expect(problemsOf(more)).toMatchObject([{ code: 'too-many-parts', path: '/parts' }]);
  });
});

describe('circuits that look odd and are taken', () => {
  const spare = { ref: 'X1', between: ['N1', 'SPARE'] };

  it.each([
    ['a resistor that feeds nothing', { ...spare, kind: 'resistor', ohms: 1000 }],
    ['a capacitor as the only tie of a node', { ...spare, kind: 'capacitor', farads: 1e-7 }],
  ])('%s', (_what, part) => {
    const netlist = series(117, [100, 100]);
    const points = [{ node: 'SPARE', label: 'Spare lug' }];
    expect(problemsOf({ ...netlist, parts: [...netlist.parts, part], points })).toEqual([]);
  });

  it('a transformer’s primary that only the line ties to the rest', () => {
    const parts = [
      { ref: 'LP', kind: 'resistor', between: ['L', 'N'], ohms: 5000 },
      { ref: 'T1', kind: 'winding', between: ['S', 'CHASSIS'], volts: 6.3, ohms: 0.1 },
      { ref: 'V1', kind: 'heater', between: ['S', 'CHASSIS'], volts: 6.3, amps: 0.3 },
    ];
    const line = { hot: 'L', return: 'N', volts: 117, hertz: 60 };
    expect(
      problemsOf({ ohmstead: 1, title: 'Fed by a transformer', reference: 'CHASSIS', line, parts }),
    ).toEqual([]);
  });
});
