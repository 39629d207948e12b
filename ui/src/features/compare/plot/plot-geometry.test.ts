import { type ComparePoint } from '@engine/diagnosis-types';
import { describe, expect, it } from 'vitest';
import {
  deviationPhrase,
  firstTake,
  percentOff,
  plottedOf,
  pointsOf,
  takesOf,
  verdictOf,
} from './compare-model';
import { plotOf } from './plot-geometry';

const circuit = {
  reference: 'CHASSIS',
  line: { hot: 'L', return: 'CHASSIS', volts: 117, hertz: 60 },
};

function point(overrides: Partial<ComparePoint>): ComparePoint {
  return {
    kind: 'point',
    key: 'ac-volts B1',
    label: 'Switch',
    take: 'ac-volts',
    at: ['B1', 'CHASSIS'],
    value: 100,
    low: 94,
    high: 106,
    order: 0,
    ...overrides,
  };
}

describe('comparing', () => {
  it('lists kinds of reading, volts before ohms', () => {
    expect(takesOf([point({ take: 'ohms' }), point({})])).toEqual(['ac-volts', 'ohms']);
  });

  it('begins with the volts that most points have', () => {
    const dc = point({ take: 'dc-volts' });
    const all = [
      point({ at: ['L', 'CHASSIS'] }),
      dc,
      dc,
      ...[1, 2, 3].map(() => point({ take: 'ohms' })),
    ];
    expect(firstTake(all, circuit)).toBe('dc-volts');
    expect(firstTake([point({ take: 'ohms' })], circuit)).toBe('ohms');
    expect(firstTake([], circuit)).toBeUndefined();
  });

  it('orders points down the string, parts after them', () => {
    const points = [point({ order: 3 }), point({ kind: 'part', order: 1 }), point({ order: 2 })];
    expect(pointsOf(points, 'ac-volts', circuit).map(({ order }) => order)).toEqual([2, 3, 1]);
  });

  it('begins with the line and leaves readings between other nodes for after the string', () => {
    const points = [
      point({ order: 1, at: ['B3', 'B4'], label: 'between' }),
      point({ order: 2, label: 'down' }),
      point({ order: 9, at: ['L', 'CHASSIS'], label: 'L to CHASSIS' }),
    ];
    const labels = pointsOf(points, 'ac-volts', circuit).map(({ label }) => label);
    expect(labels).toEqual(['The line', 'down', 'between']);
  });

  it('draws parts only where they were measured', () => {
    const points = [point({}), point({ kind: 'part' }), point({ kind: 'part', measured: 5 })];
    expect(plottedOf(points)).toHaveLength(2);
  });

  it.each([
    [{ measured: 101, deviations: 0.3 }, 'inside', '1 % high, well inside what tolerances allow'],
    [{ measured: 92, deviations: -2.6 }, 'edge', '8 % low, at the edge of what tolerances allow'],
    [{ measured: 0, deviations: -30 }, 'outside', '100 % low, far outside what tolerances allow'],
    [{ measured: 'OL' as const }, 'outside', 'open where a value is expected'],
    [{ measured: 'OL' as const, value: null }, 'inside', 'as it should be'],
    [{}, null, 'not measured yet'],
  ])('judges %o as %s', (overrides, verdict, words) => {
    const one = point(overrides);
    expect(verdictOf(one)).toBe(verdict);
    expect(deviationPhrase(one)).toBe(words);
  });

  it('says no per cent of next to nothing', () => {
    expect(percentOff(0.2, 0)).toBe('');
  });
});

describe('the plot down the string', () => {
  const points = [
    point({ value: 117, low: 112, high: 121, measured: 117 }),
    point({ value: 60, low: 55, high: 66, published: 63 }),
    point({ value: null, low: null, high: null }),
    point({ value: 12, low: 11, high: 13, measured: 'OL' }),
  ];
  const plot = plotOf(points, circuit, 600, 120);

  it('stands everything inside its frame, one row below the other', () => {
    for (const { low, high, computed, measured, published } of plot.rows) {
      for (const x of [low, high, computed, measured, published]) {
        if (x !== null) expect(x >= 120 && x <= 600).toBe(true);
      }
    }
    const ys = plot.rows.map(({ y }) => y);
    expect(ys).toEqual([...ys].sort((a, b) => a - b));
  });

  it('breaks the band where there is no computed value', () => {
    expect(plot.bands).toHaveLength(2);
  });

  it('marks over range at the right edge', () => {
    expect(plot.rows[3]).toMatchObject({ isOver: true, verdict: 'outside' });
    expect(plot.rows[3].measured).toBeGreaterThan(plot.rows[0].measured!);
  });

  it('compresses the scale where values lie decades apart', () => {
    expect(plot.isCompressed).toBe(false);
    const wide = plotOf(
      [...points, point({ value: 60_000, low: 5e4, high: 7e4 })],
      circuit,
      600,
      120,
    );
    expect(wide.isCompressed).toBe(true);
    expect(wide.rows[3].computed!).toBeGreaterThan(125);
  });
});
