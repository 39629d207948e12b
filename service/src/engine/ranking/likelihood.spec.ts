import { determinant, inverse, Matrix } from 'ml-matrix';
import type { Reading } from '../netlist/types';
import { compileCircuit } from '../solver/circuit';
import { consoleString, seeded } from '../testing/circuits';
import { SETTINGS } from '../tolerances';
import { normalTail } from './normal';
import { Scorer } from './scorer';

const PLACES: Reading[] = [
  { take: 'ac-volts', at: ['C', 'N'] },
  { take: 'ac-volts', at: ['E', 'N'] },
  { take: 'ohms', part: 'V1' },
  { take: 'ohms', at: ['D', 'N'] },
];

/** Readings a little off what a healthy set shows. */
function nearlyHealthy(): Reading[] {
  const scorer = new Scorer(compileCircuit(consoleString(), 117), PLACES);
  const { shown } = scorer.predict([], scorer.specs)!;
  return PLACES.map((reading, r) => ({
    ...reading,
    value: shown[r] * [1.01, 0.992, 1.05, 0.97][r],
  }));
}
const READINGS = nearlyHealthy();

describe('likelihood', () => {
  it('is the multivariate normal that ml-matrix gives for the same covariance', () => {
    const scorer = new Scorer(compileCircuit(consoleString(), 117), READINGS);
    const like = scorer.scoreWithSpread([])!.like;
    const predictions = scorer.predict([], scorer.specs)!;
    scorer.likelihood.score(predictions, scorer.sigmasOf([]));
    const n = READINGS.length;
    const covariance = Matrix.from1DArray(n, n, [...scorer.likelihood.covariance]);
    const residual = Matrix.columnVector(
      scorer.observations.map(({ y }, r) => y - predictions.mean[r]),
    );
    const chi2 = residual.transpose().mmul(inverse(covariance)).mmul(residual).get(0, 0);
    const expected =
      -0.5 * (chi2 + Math.log(determinant(covariance)) + n * Math.log(2 * Math.PI)) +
      n * Math.log(1 - SETTINGS.slipChance);
    expect(like.slipCount).toBe(0);
    expect(like.log).toBeCloseTo(expected, 8);
  });

  it('calls one wild reading a slip and scores the others as if it were not there', () => {
    const circuit = compileCircuit(consoleString(), 117);
    const wild: Reading = { take: 'ohms', part: 'R1A', value: 6800 };
    const without = new Scorer(circuit, READINGS).score([])!;
    const scorer = new Scorer(circuit, [...READINGS, wild]);
    const withIt = scorer.score([])!;
    expect([...withIt.slips]).toEqual([0, 0, 0, 0, 1]);
    const price = Math.log(SETTINGS.slipChance) + scorer.observations[4].logWide;
    expect(withIt.log).toBeCloseTo(without.log + price, 6);
  });
});

describe('normalTail', () => {
  it('agrees with the tables of Abramowitz & Stegun, 26.1', () => {
    expect(normalTail(0)).toBeCloseTo(0.5, 7);
    expect(normalTail(1)).toBeCloseTo(0.158655254, 6);
    expect(normalTail(1.96)).toBeCloseTo(0.024997895, 6);
    expect(normalTail(-2)).toBeCloseTo(0.977249868, 6);
  });

  it('falls', () => {
    const random = seeded(3);
    for (let i = 0; i < 50; i += 1) {
      const z = 6 * random() - 3;
      expect(normalTail(z + 0.1)).toBeLessThan(normalTail(z));
    }
  });
});
