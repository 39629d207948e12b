import { figures, type Formula, sumOf, toMathml, toTex, toText } from './formula';

const v = (node: string): Formula => ({ kind: 'volts', node });
const number = (text: string): Formula => ({ kind: 'number', text });

describe('formula writers', () => {
  const fraction: Formula = {
    kind: 'fraction',
    top: sumOf([
      { isMinus: false, of: number('117') },
      { isMinus: true, of: v('A_1') },
    ]),
    bottom: { kind: 'quantity', text: '4.7', unit: 'kΩ' },
    part: 'R<1>',
  };

  it('writes plain text', () => {
    expect(toText(fraction)).toBe('(117 − v(A_1))/4.7 kΩ [R<1>]');
  });

  it('writes TeX with names kept literal', () => {
    expect(toTex(fraction)).toBe(
      '\\underbrace{\\frac{117 - v_{\\mathrm{A\\_1}}}{4.7\\,\\mathrm{k\\Omega }}}_{\\mathrm{R<1>}}',
    );
  });

  it('writes MathML with names escaped', () => {
    const text = toMathml(fraction);
    expect(text).toContain('<msub><mi>v</mi><mtext>A_1</mtext></msub>');
    expect(text).toContain('R&#60;1&#62;');
    expect((text.match(/<mrow>/g) ?? []).length).toBe((text.match(/<\/mrow>/g) ?? []).length);
  });

  it('writes numbers with a true minus and powers of ten', () => {
    expect(figures(-0.5)).toBe('−0.5');
    expect(figures(123456)).toBe('123460');
    expect(figures(2.5e9)).toBe('2.5e9');
    expect(toTex(number(figures(-2.5e-9)))).toBe('-2.5\\cdot 10^{-9}');
  });
});
