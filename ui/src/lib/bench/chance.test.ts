import { describe, expect, it } from 'vitest';
import {
  chanceInWords,
  deviationInWords,
  gainInWords,
  minutesInWords,
  timesInWords,
} from './chance';

describe('words for chances', () => {
  it.each([
    [0.999, 'almost certain'],
    [0.95, 'about 19 in 20'],
    [0.83, 'about 8 in 10'],
    [0.5, 'about 5 in 10'],
    [0.1, 'about 1 in 10'],
    [0.03, 'about 3 in 100'],
    [0.002, 'less than 1 in 100'],
    [Number.NaN, 'not known'],
  ])('says %f as %s', (probability, words) => {
    expect(chanceInWords(probability)).toBe(words);
  });

  it('never says ten in ten', () => {
    for (let p = 0; p <= 1; p += 0.001) expect(chanceInWords(p)).not.toContain('10 in 10');
  });

  it.each([
    [12, '12 times more likely'],
    [0.25, '4 times less likely'],
    [1.1, 'about as likely either way'],
    [6.42, '6.4 times more likely'],
    [4100, 'over 1,000 times more likely'],
    [0, 'hardly possible'],
  ])('says %f times as %s', (times, words) => {
    expect(timesInWords(times)).toBe(words);
  });

  it.each([
    [0.4, 'well inside'],
    [-1.6, 'inside'],
    [2.4, 'at the edge'],
    [-4, 'outside'],
    [9, 'far outside'],
  ])('says a deviation of %f as %s what tolerances allow', (deviations, start) => {
    expect(deviationInWords(deviations)).toMatch(new RegExp(`^${start} .*what tolerances allow$`));
  });

  it('says time and gain', () => {
    expect(minutesInWords(0.2)).toBe('under a minute');
    expect(minutesInWords(1)).toBe('about a minute');
    expect(minutesInWords(4)).toBe('about 4 minutes');
    expect(gainInWords(1.2)).toBe('would settle a great deal');
  });
});
