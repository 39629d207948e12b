import { consoleString } from '@/testing/fixtures/circuits';
import { describe, expect, it } from 'vitest';
import { checkEntry } from './check-entry';

describe('a typed reading', () => {
  it.each([
    ['118.4', 'ac-volts', 118.4],
    ['4.7k', 'ohms', 4700],
    ['4k7', 'ohms', 4700],
    ['ol', 'ohms', 'OL'],
    ['150mA', 'amps', 0.15],
  ] as const)('reads %s as %s', (text, take, value) => {
    expect(checkEntry(text, { take, part: 'R1A' }, consoleString)).toEqual({ ok: true, value });
  });

  it.each([
    ['12 V', 'ohms'],
    ['fifteen', 'ohms'],
    ['OL', 'ac-volts'],
    ['-20', 'ohms'],
    ['90000', 'ac-volts'],
  ] as const)('refuses %s for %s in a sentence', (text, take) => {
    const checked = checkEntry(text, { take, part: 'R1A' }, consoleString);
    expect(checked).toMatchObject({ ok: false, message: expect.stringMatching(/[.?]$/) });
  });
});
