import { describe, expect, test } from 'vitest';
import { comparisonInWords, conditionsInWords, effectInWords, partsInWords } from './rule-words';

describe('comparisonInWords', () => {
  test.each([
    ['heaterCount', 'greaterThanInclusive', 1, 'The circuit has at least 1 heater.'],
    ['dropperSectionCount', 'greaterThan', 2, 'The circuit has more than 2 dropper sections.'],
    ['hasLine', 'equal', true, 'The circuit is fed from the line.'],
    ['isHumming', 'equal', false, 'The set does not hum.'],
    ['isHumming', 'notEqual', true, 'The set does not hum.'],
    ['make', 'equal', 'paper', 'Its make is paper.'],
    ['ohms', 'greaterThanInclusive', 100_000, 'Its nominal value is at least 100 kΩ.'],
    [
      'lineRatio',
      'greaterThan',
      1.05,
      'The line voltage of the day is more than 105 % of its design value.',
    ],
  ])('%s %s %s', (fact, operator, value, sentence) => {
    expect(comparisonInWords({ fact, operator, value })).toBe(sentence);
  });

  test('names a fact that is new to the page as it is', () => {
    expect(comparisonInWords({ fact: 'tubeAge', operator: 'lessThan', value: 3 })).toBe(
      '“tubeAge” less than 3.',
    );
  });
});

test('conditions keep their nesting', () => {
  const inner = { any: [{ fact: 'isOpen', operator: 'equal', value: true }] };
  const list = conditionsInWords({
    all: [inner, { fact: 'hasLine', operator: 'equal', value: true }],
  });
  expect(list.lead).toBe('All of this is so:');
  expect(list.items).toEqual([
    {
      lead: 'At least one of these is so:',
      items: ['With the set off, it reads OL across itself.'],
    },
    'The circuit is fed from the line.',
  ]);
});

test('parts are named by what selects them', () => {
  expect(partsInWords({ isThis: true })).toBe('the part at hand');
  expect(partsInWords({ kind: ['capacitor'], make: ['electrolytic'], assembly: 'same' })).toBe(
    'an electrolytic capacitor in the same body',
  );
  expect(partsInWords({ isInString: true })).toBe('a part in the heater string');
});

test('a factor against is said as less likely', () => {
  const against = { effect: 'speaks-against', parts: { isThis: true }, mode: 'open', factor: 4 };
  expect(effectInWords(against as Parameters<typeof effectInWords>[0]).sentence).toBe(
    'It makes “the part at hand, open” 4 times less likely.',
  );
});
