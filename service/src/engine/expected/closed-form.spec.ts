import { LuDecomposition, Matrix } from 'ml-matrix';
import { closedFormOf, type NodalSystem, solveExpected } from '.';
import { matrixOf, randomLadder } from './testing/networks';
import { PUBLISHED } from './testing/published';

const divider: NodalSystem = {
  nodes: ['L', 'H1', 'N'],
  conductances: [
    { part: 'R1', a: 'L', b: 'H1', siemens: 1 / 22 },
    { part: 'R2', a: 'H1', b: 'N', siemens: 1 / 95 },
  ],
  fixed: { L: 117, N: 0 },
  injections: {},
};

describe('worked examples', () => {
  const cases = PUBLISHED.flatMap(({ id, source, status, system, implied }) =>
    (implied ?? []).map((asked) => ({ id, source, status, system, ...asked })),
  );
  it.each(cases)(
    '$id: $part is worked out as $ohms Ω ($source; $status)',
    ({ part, node, volts, ohms, within, system }) => {
      const { impliedValue } = closedFormOf(system, part, { a: node, b: 'N' }, volts);
      expect(Math.abs(impliedValue! - ohms)).toBeLessThanOrEqual(within);
    },
  );
});

describe('closedFormOf', () => {
  it('writes a divider as everyone knows it', () => {
    // Source: v = 117·R2/(R1 + R2), hand working.
    const form = closedFormOf(divider, 'R1', { a: 'H1', b: 'N' }, 60);
    expect(form.text).toBe('v(H1) = 11115/(R1 + 95)');
    expect(form.impliedValue).toBeCloseTo(11115 / 60 - 95, 6);
    expect(form.tex).toBe('v_{\\mathrm{H1}} = \\frac{11115}{\\mathrm{R1} + 95}');
    expect(form.mathml).toContain('<mfrac>');
    expect(form.unit).toBe('ohms');
    expect(form.note).toContain('instead of 22 Ω');
    const other = closedFormOf(divider, 'R2', { a: 'H1', b: 'N' }, 100);
    expect(other.text).toBe('v(H1) = 117 − 2574/(R2 + 22)');
    expect(other.impliedValue).toBeCloseTo(2574 / 17 - 22, 6);
  });

  it('writes a current that is forced through a part as a straight line', () => {
    const forced: NodalSystem = {
      nodes: ['B1', 'B2', 'N'],
      conductances: [
        { part: 'R1', a: 'B1', b: 'B2', siemens: 1 / 1500 },
        { part: 'R2', a: 'B2', b: 'N', siemens: 1 / 5000 },
      ],
      fixed: { N: 0 },
      injections: { B1: 0.02 },
    };
    // Source: v(B1) = 0.02·(R1 + 5000), hand working.
    const form = closedFormOf(forced, 'R1', { a: 'B1', b: 'N' }, 150);
    expect(form.text).toBe('v(B1) = 100 + 0.02·R1');
    expect(form.impliedValue).toBeCloseTo(2500, 5);
  });

  it('says when a reading does not depend on the part', () => {
    const balanced = PUBLISHED.find(({ id }) => id === 'W23')!.system;
    const form = closedFormOf(balanced, 'RM', { a: 'L', b: 'N' }, 5);
    expect(form.impliedValue).toBeNull();
    expect(form.note).toBe('This reading does not depend on RM.');
  });

  it('says when no resistance explains the reading', () => {
    const negative = closedFormOf(divider, 'R1', { a: 'H1', b: 'N' }, 130);
    expect(negative.impliedValue).toBeNull();
    expect(negative.note).toContain('less than nothing');
    const never = closedFormOf(divider, 'R2', { a: 'H1', b: 'N' }, 117);
    expect(never.impliedValue).toBeNull();
  });

  it('refuses a part that is no resistance there', () => {
    expect(() => closedFormOf(divider, 'C7', { a: 'H1', b: 'N' }, 50)).toThrow(
      expect.objectContaining({ code: 'part-not-in-equations' }),
    );
  });

  // Source: the part set to the implied value and the network solved by an outside library.
  it.each([3, 6, 12])('brings the reading back in a ladder of %p nodes', (nodes) => {
    const system = randomLadder(nodes, 4);
    const target = { a: `H${nodes}`, b: 'N' };
    const wanted = { ...system, conductances: system.conductances.slice() };
    wanted.conductances[1] = {
      ...system.conductances[1],
      siemens: system.conductances[1].siemens / 3.7,
    };
    const { names, g, i } = matrixOf(wanted);
    const volts = new LuDecomposition(new Matrix(g)).solve(Matrix.columnVector(i));
    const measured = volts.get(names.indexOf(target.a), 0);
    const form = closedFormOf(system, 'R2', target, measured);
    expect(form.impliedValue! / (3.7 / system.conductances[1].siemens)).toBeCloseTo(1, 6);
  });

  it('finds a joint of 0.05 Ω gone high in a string of hundreds of ohms', () => {
    const system = randomLadder(8, 5);
    system.conductances[2] = { ...system.conductances[2], siemens: 1 / 0.05 };
    const bad = { ...system, conductances: system.conductances.slice() };
    bad.conductances[2] = { ...system.conductances[2], siemens: 1 / 180 };
    const measured = solveExpected(bad, {}).solution.H4;
    const { impliedValue } = closedFormOf(system, 'R3', { a: 'H4', b: 'N' }, measured);
    expect(impliedValue! / 180).toBeCloseTo(1, 5);
  });

  it('leaves nothing behind that changes the next solution', () => {
    // The algebra library has been seen to round fractions to eight digits after solving for a symbol.
    const system = randomLadder(6, 9);
    const before = solveExpected(system, {});
    closedFormOf(divider, 'R1', { a: 'H1', b: 'N' }, 60);
    expect(solveExpected(system, {}).solution).toEqual(before.solution);
  });
});
