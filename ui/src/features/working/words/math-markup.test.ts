import { describe, expect, it } from 'vitest';
import { readMarkup } from './math-markup';

describe('MathML of the service', () => {
  it('is read with its structure and without attributes', () => {
    const markup =
      '<math xmlns="http://www.w3.org/1998/Math/MathML"><mfrac class="x"><mi>v</mi><mn>12</mn></mfrac></math>';
    expect(readMarkup(markup)).toEqual({
      tag: 'math',
      children: [
        {
          tag: 'mfrac',
          children: [
            { tag: 'mi', children: ['v'] },
            { tag: 'mn', children: ['12'] },
          ],
        },
      ],
    });
  });

  it.each([
    ['broken markup', '<math><mi>v</math>'],
    ['anything but mathematics', '<math><mi><script>alert(1)</script></mi></math>'],
    ['another root', '<p>v</p>'],
  ])('is refused for %s', (_name, markup) => {
    expect(readMarkup(markup)).toBeNull();
  });
});
