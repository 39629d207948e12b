import { Matrix, solve } from 'ml-matrix';
import { seeded } from '../testing/circuits';
import { narrowOrder, ProfileMatrix } from './profile-matrix';

describe('ProfileMatrix', () => {
  it('solves random conductance networks as ml-matrix does', () => {
    const random = seeded(7);
    for (let trial = 0; trial < 20; trial += 1) {
      const n = 3 + Math.floor(random() * 15);
      const pairs: [number, number][] = [];
      for (let i = 1; i < n; i += 1) pairs.push([i, Math.floor(random() * i)]);
      for (let i = 0; i < n; i += 1) {
        const a = Math.floor(random() * n);
        const b = Math.floor(random() * n);
        if (a !== b) pairs.push([a, b]);
      }
      const profile = new ProfileMatrix(n, pairs);
      const dense = Matrix.zeros(n, n);
      const add = (i: number, j: number, g: number) => {
        profile.addConductance(i, j, g);
        if (i >= 0) dense.set(i, i, dense.get(i, i) + g);
        if (j >= 0) dense.set(j, j, dense.get(j, j) + g);
        if (i >= 0 && j >= 0) {
          dense.set(i, j, dense.get(i, j) - g);
          dense.set(j, i, dense.get(j, i) - g);
        }
      };
      pairs.forEach(([i, j]) => add(i, j, 10 ** (4 * random() - 3)));
      add(0, -1, 1);
      const b = Float64Array.from({ length: n }, () => random());
      const expected = solve(dense, Matrix.columnVector([...b])).to1DArray();
      expect(profile.factor()).toBe(true);
      const actual = profile.solve(b.slice());
      expected.forEach((value, i) => expect(actual[i]).toBeCloseTo(value, 6));
    }
  });

  it('says so when a node has no path to a known voltage', () => {
    const matrix = new ProfileMatrix(2, [[0, 1]]);
    matrix.addConductance(0, 1, 1);
    expect(matrix.factor()).toBe(false);
  });

  it('orders a shuffled string so that neighbours stay neighbours', () => {
    const edges: [number, number][] = [
      [4, 0],
      [0, 3],
      [3, 1],
      [1, 2],
    ];
    const position = narrowOrder(5, edges);
    for (const [a, b] of edges) expect(Math.abs(position[a] - position[b])).toBe(1);
  });
});
