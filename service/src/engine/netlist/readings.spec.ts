import { consoleString } from '../testing/circuits';
import { checkReading } from './readings';
import type { Reading } from './types';

function problemOf(reading: unknown): object | undefined {
  return checkReading(consoleString(), reading as Reading)[0];
}

describe('a reading that fits', () => {
  it.each<[string, Reading]>([
    ['volts between two nodes', { take: 'ac-volts', at: ['B', 'N'], value: 104.2 }],
    ['volts on the line’s own node', { take: 'ac-volts', at: ['L', 'N'], value: 117 }],
    ['negative DC', { take: 'dc-volts', at: ['B', 'N'], value: -0.6 }],
    ['the last digits of a meter below zero', { take: 'ac-volts', at: ['B', 'N'], value: -0.0002 }],
    ['ohms over range', { take: 'ohms', part: 'R1A', value: 'OL' }],
    ['leads zeroed a little too far', { take: 'ohms', part: 'R1A', value: -0.1 }],
    ['a current in series with a part', { take: 'amps', part: 'V1', value: 0.3 }],
    ['a look', { take: 'sign', part: 'DS1', seen: 'dark' }],
    [
      'a moving-coil meter on its range',
      {
        take: 'dc-volts',
        at: ['B', 'N'],
        value: 10,
        meter: { ohmsPerVolt: 20000, fullScale: 50, ofFullScale: 0.03 },
      },
    ],
  ])('%s', (_what, reading) => {
    expect(problemOf(reading)).toBeUndefined();
  });
});

describe('a reading that is refused', () => {
  it.each<[string, unknown, { code: string; path: string }]>([
    ['an unknown kind', { take: 'watts', value: 1 }, { code: 'unknown-take', path: '/take' }],
    [
      'a node that is not there',
      { take: 'ac-volts', at: ['Z', 'N'], value: 1 },
      { code: 'unknown-node', path: '/at' },
    ],
    [
      'both leads on one node',
      { take: 'ac-volts', at: ['B', 'B'], value: 1 },
      { code: 'same-node', path: '/at' },
    ],
    ['no place', { take: 'ac-volts', value: 1 }, { code: 'place-needed', path: '/at' }],
    [
      'two places',
      { take: 'ohms', at: ['B', 'N'], part: 'R1A', value: 1 },
      { code: 'two-places', path: '/part' },
    ],
    [
      'a part that is not there',
      { take: 'ohms', part: 'R99', value: 1 },
      { code: 'unknown-part', path: '/part' },
    ],
    [
      'a current between two nodes',
      { take: 'amps', at: ['B', 'N'], value: 1 },
      { code: 'part-needed', path: '/part' },
    ],
    [
      'a voltage over range',
      { take: 'ac-volts', at: ['B', 'N'], value: 'OL' },
      { code: 'over-range', path: '/value' },
    ],
    ['no value', { take: 'ohms', part: 'R1A' }, { code: 'value-needed', path: '/value' }],
    [
      'a value as text',
      { take: 'ohms', part: 'R1A', value: '5' },
      { code: 'value-needed', path: '/value' },
    ],
    [
      'ohms far below zero',
      { take: 'ohms', part: 'R1A', value: -5 },
      { code: 'negative-ohms', path: '/value' },
    ],
    [
      'AC volts with a sign',
      { take: 'ac-volts', at: ['B', 'N'], value: -5 },
      { code: 'negative-volts', path: '/value' },
    ],
    [
      // Eight times a 117 V line is more than any doubler of it gives.
      'volts that this line cannot give',
      { take: 'dc-volts', at: ['B', 'N'], value: 1170 },
      { code: 'out-of-range', path: '/value' },
    ],
    [
      'a sign that is no word of the list',
      { take: 'sign', part: 'DS1', seen: 'sad' },
      { code: 'seen-needed', path: '/seen' },
    ],
    [
      'a meter of no ohms',
      { take: 'ac-volts', at: ['B', 'N'], value: 1, meter: { ohms: 0 } },
      { code: 'bad-meter', path: '/meter/ohms' },
    ],
    [
      'a moving-coil meter without its range',
      { take: 'ac-volts', at: ['B', 'N'], value: 1, meter: { ohmsPerVolt: 20000 } },
      { code: 'bad-meter', path: '/meter/fullScale' },
    ],
    [
      'a meter with a field nobody knows',
      { take: 'ac-volts', at: ['B', 'N'], value: 1, meter: { toString: 1 } },
      { code: 'bad-meter', path: '/meter/toString' },
    ],
  ])('%s', (_what, reading, expected) => {
    expect(problemOf(reading)).toMatchObject(expected);
  });
});
