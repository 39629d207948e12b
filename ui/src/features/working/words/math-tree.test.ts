import { describe, expect, it } from 'vitest';
import { toMathTree } from './math-tree';

describe('an equation read for display', () => {
  it('knows fractions and equality', () => {
    expect(toMathTree('(v1 - 2.5)/12 = 0')).toMatchObject({
      kind: 'operator',
      operator: '=',
      left: { kind: 'fraction', over: { operator: '-' }, under: { text: '12' } },
    });
  });

  it('binds products before sums and signs before both', () => {
    expect(toMathTree('-a + b*c')).toMatchObject({
      operator: '+',
      left: { kind: 'minus' },
      right: { operator: '*' },
    });
  });

  it('knows powers of ten and functions', () => {
    expect(toMathTree('1.5e-6*sqrt(x)^2')).not.toBeNull();
  });

  it.each(['', 'a b', '(a', 'a +', 'volts at “B1”'])('leaves %s as text', (text) => {
    expect(toMathTree(text)).toBeNull();
  });
});
