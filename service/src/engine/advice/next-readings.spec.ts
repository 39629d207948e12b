import { gain, type Outlook } from './next-readings';

function shows(mean: number, sigma = 1, over = 0): Outlook {
  return { mean, sigma, over, shown: mean };
}

describe('gain', () => {
  it('is the whole entropy when every suspect shows something else (de Kleer & Williams 1987)', () => {
    const weights = [0.5, 0.25, 0.125, 0.125];
    const bits = gain(weights, [shows(0), shows(100), shows(200), shows(300)]);
    // −Σ p·log2 p = 1.75 bits.
    expect(bits).toBeCloseTo(1.75, 3);
  });

  it('is nothing when all show the same', () => {
    expect(gain([0.6, 0.4], [shows(5), shows(5)])).toBeCloseTo(0, 6);
  });

  it('counts over range as a reading', () => {
    expect(gain([0.5, 0.5], [shows(5, 1, 1), shows(5, 1, 0)])).toBeCloseTo(1, 6);
  });

  it('grows as the suspects move apart and never exceeds the entropy', () => {
    let last = 0;
    for (const apart of [0.5, 1, 2, 4, 8]) {
      const bits = gain([0.5, 0.5], [shows(0), shows(apart)]);
      expect(bits).toBeGreaterThan(last);
      expect(bits).toBeLessThanOrEqual(1 + 1e-6);
      last = bits;
    }
  });
});
