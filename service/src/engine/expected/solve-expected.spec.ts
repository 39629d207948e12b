import { lusolve } from 'mathjs';
import { LuDecomposition, Matrix } from 'ml-matrix';
import { EngineError } from '../errors';
import { solveExpected } from '.';
import { PUBLISHED } from './testing/published';
import { matrixOf, randomLadder } from './testing/networks';

describe('worked examples', () => {
  it.each(PUBLISHED.map((example) => [example.id, example] as const))(
    '%s agrees with its source',
    (_id, { system, volts, amps, watts, source, status, title }) => {
      const { solution, residual } = solveExpected(system, {});
      const where = `${title}: ${source} (${status})`;
      expect(residual).toBeLessThan(1e-9);
      for (const { node, value, within } of volts) {
        expect({ where, off: Math.abs(solution[node] - value) <= within }).toEqual({
          where,
          off: true,
        });
      }
      const current = (part: string) => {
        const { a, b, siemens } = system.conductances.find((one) => one.part === part)!;
        return { amps: (solution[a] - solution[b]) * siemens, siemens };
      };
      for (const { part, value, within } of amps ?? []) {
        expect(Math.abs(current(part).amps - value)).toBeLessThanOrEqual(within);
      }
      for (const { part, value, within } of watts ?? []) {
        const { amps: i, siemens } = current(part);
        expect(Math.abs((i * i) / siemens - value)).toBeLessThanOrEqual(within);
      }
    },
  );
});

describe('random ladders', () => {
  // Source: the same matrices solved by two outside libraries.
  it.each([2, 4, 5, 8, 12, 20])('%p nodes agree with ml-matrix and mathjs', (nodes) => {
    for (let seed = 1; seed <= 2; seed += 1) {
      const system = randomLadder(nodes, seed);
      const { names, g, i } = matrixOf(system);
      const lu = new LuDecomposition(new Matrix(g)).solve(Matrix.columnVector(i)).to1DArray();
      const other = (lusolve(g, i) as number[][]).map(([value]) => value);
      const check = Object.fromEntries(names.map((name, k) => [name, lu[k]]));
      const working = solveExpected(system, check);
      expect(working.agreesWithSolver).toBe(true);
      expect(working.residual).toBeLessThan(1e-9);
      names.forEach((name, k) => {
        const size = Math.max(Math.abs(other[k]), 1e-3);
        expect(Math.abs(working.solution[name] - other[k])).toBeLessThan(1e-8 * size);
      });
    }
  });

  it.each([5, 12, 20])('%p nodes keep 1 GΩ beside 0.01 Ω', (nodes) => {
    for (let seed = 1; seed <= 2; seed += 1) {
      const system = randomLadder(nodes, seed, (random) =>
        random() < 0.15 ? 1e9 : random() < 0.15 ? 0.01 : 10 + 990 * random(),
      );
      expect(solveExpected(system, {}).residual).toBeLessThan(1e-9);
    }
  });
});

describe('solveExpected', () => {
  const divider = {
    nodes: ['L', 'H1', 'N'],
    conductances: [
      { part: 'R1', a: 'L', b: 'H1', siemens: 1 / 22, note: 'hot, at the current it carries' },
      { part: 'R2', a: 'H1', b: 'N', siemens: 1 / 95 },
    ],
    fixed: { L: 117, N: 0 },
    injections: {},
  };

  it('writes each equation for a person', () => {
    const { equations, notes, nodes } = solveExpected(divider, {});
    expect(nodes).toEqual(['L', 'H1', 'N']);
    expect(equations).toHaveLength(1);
    expect(equations[0].text).toBe('(117 − v(H1))/22 Ω [R1] − v(H1)/95 Ω [R2] = 0');
    expect(equations[0].tex).toContain('\\frac{117 - v_{\\mathrm{H1}}}{22\\,\\mathrm{\\Omega }}');
    expect(equations[0].mathml).toMatch(/^<math [^>]*><mrow>.*<mfrac>.*<\/mrow><\/math>$/);
    expect(notes).toEqual(['R1 (22 Ω): hot, at the current it carries']);
  });

  it('says where it and the numeric engine disagree', () => {
    const right = solveExpected(divider, { H1: 95 });
    expect(right.agreesWithSolver).toBe(true);
    const wrong = solveExpected(divider, { H1: 95.001 });
    expect(wrong.agreesWithSolver).toBe(false);
    expect(wrong.notes.join(' ')).toContain('At H1 the equations give 95 V');
  });

  it('takes an injected current', () => {
    const working = solveExpected({ ...divider, injections: { H1: 0.5 } }, {});
    // Source: superposition, hand working.
    expect(working.solution.H1).toBeCloseTo(95 + (0.5 * 22 * 95) / 117, 9);
    expect(working.equations[0].text).toContain('+ 500 mA');
  });

  it('works when every node is known', () => {
    const { solution, equations, residual } = solveExpected(
      { nodes: ['L', 'N'], conductances: [], fixed: { L: 117, N: 0 }, injections: {} },
      { L: 117 },
    );
    expect(solution).toEqual({ L: 117, N: 0 });
    expect(equations).toEqual([]);
    expect(residual).toBe(0);
  });

  it('refuses an island and names it', () => {
    const island = {
      ...divider,
      nodes: [...divider.nodes, 'X', 'Y'],
      conductances: [...divider.conductances, { part: 'R9', a: 'X', b: 'Y', siemens: 1 }],
    };
    let caught: unknown;
    try {
      solveExpected(island, {});
    } catch (error) {
      caught = error;
    }
    expect(caught).toBeInstanceOf(EngineError);
    expect((caught as EngineError).code).toBe('island');
    expect((caught as EngineError).problems[0].nodes).toEqual(['X', 'Y']);
  });

  it('takes node names that mean something to the algebra', () => {
    const names = { H1: 'pi', L: 'e', N: 'i' } as Record<string, string>;
    const named = {
      nodes: divider.nodes.map((node) => names[node]),
      conductances: divider.conductances.map((one) => ({
        ...one,
        a: names[one.a],
        b: names[one.b],
      })),
      fixed: { e: 117, i: 0 },
      injections: {},
    };
    expect(solveExpected(named, {}).solution.pi).toBeCloseTo(95, 9);
  });
});
