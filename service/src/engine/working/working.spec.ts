import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { readNetlist } from '../netlist/read';
import { solve } from '../solve';
import { closedForm, expectedWorking } from '.';

const FOLDER = join(__dirname, '..', '..', '..', '..', 'netlists');
const NAMES = readdirSync(FOLDER).filter(
  (name) => name.endsWith('.json') && !['families.json', 'netlist.schema.json'].includes(name),
);
const load = (name: string) => readNetlist(JSON.parse(readFileSync(join(FOLDER, name), 'utf8')));

describe('nerdamer against the numeric engine', () => {
  it('has circuits to compare', () => {
    expect(NAMES.length).toBeGreaterThanOrEqual(4);
  });

  it.each(NAMES)('agrees on %s', (name) => {
    const netlist = load(name);
    const working = expectedWorking({ netlist, conditions: { lineVolts: 115 } });
    expect(working.notes.filter((note) => note.includes('numeric engine'))).toEqual(
      expect.not.arrayContaining([expect.stringContaining('wrong')]),
    );
    expect(working.agreesWithSolver).toBe(true);
    expect(working.residual).toBeLessThan(1e-9);
    const { nodes } = solve({ netlist, conditions: { lineVolts: 115 } });
    for (const [node, { acVolts, dcVolts }] of Object.entries(nodes)) {
      if (working.solution[node] === undefined || node === netlist.line?.hot) continue;
      const numeric = dcVolts ?? acVolts!;
      expect(Math.abs(Math.abs(working.solution[node]) - Math.abs(numeric))).toBeLessThan(
        1e-3 + 1e-5 * Math.abs(numeric),
      );
    }
  });

  it('finds what a section would have to measure, and puts it back', () => {
    const netlist = load('console-television-450.json');
    const reading = { take: 'ohms' as const, at: ['E4', 'CHASSIS'] as [string, string], value: 60 };
    const form = closedForm({ netlist, part: 'R1C', reading });
    const changed = {
      ...netlist,
      parts: netlist.parts.map((part) =>
        part.ref === 'R1C' ? { ...part, ohms: form.impliedValue! } : part,
      ),
    };
    const again = closedForm({ netlist: changed as typeof netlist, part: 'R1C', reading });
    expect(again.impliedValue).toBeCloseTo(form.impliedValue!, 4);
    expect(form.text).toContain('R1C');
    expect(form.mathml).toContain('<m');
  });

  it('refuses OL, which has no closed form', () => {
    const netlist = load('console-television-450.json');
    expect(() =>
      closedForm({ netlist, part: 'R1C', reading: { take: 'ohms', part: 'R1C', value: 'OL' } }),
    ).toThrow(/no closed form/);
  });
});
