import { describe, expect, it } from 'vitest';
import { pressKey } from './NumberPad';

const typed = (keys: string) => [...keys.split(' ')].reduce(pressKey, '');

describe('the number pad', () => {
  it.each([
    ['4 . 7 k', '4.7k'],
    ['4 . 7 k M', '4.7M'],
    ['1 . 2 . 3', '1.23'],
    ['1 2 OL', 'OL'],
    ['OL 5', '5'],
    ['6 . 3 −', '-6.3'],
    ['6 . 3 − −', '6.3'],
    ['k', ''],
  ])('turns %s into %s', (keys, text) => {
    expect(typed(keys)).toBe(text);
  });
});
