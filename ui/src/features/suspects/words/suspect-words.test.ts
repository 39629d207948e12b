import { type NextReading, type Suspect } from '@engine/diagnosis-types';
import { describe, expect, it } from 'vitest';
import {
  groupsOf,
  neededValueInWords,
  ruleInWords,
  separatorsOf,
  speaksInWords,
  wouldShowInWords,
} from './suspect-words';

function suspect(part: string, probability: number, group: number): Suspect {
  return {
    faults: [{ part, mode: 'open' }],
    probability,
    group,
    title: `${part} open`,
    reasons: [],
    evidence: [],
    rules: [],
  };
}

describe('groups of suspects', () => {
  it('keep the order of the likeliest and add up', () => {
    const groups = groupsOf([suspect('A', 0.5, 2), suspect('B', 0.3, 1), suspect('C', 0.1, 2)]);
    expect(groups.map(({ group }) => group)).toEqual([2, 1]);
    expect(groups[0].probability).toBeCloseTo(0.6);
  });

  it('know the reading that would separate them', () => {
    const [group] = groupsOf([
      suspect('R1B', 0.5, 1),
      suspect('V12', 0.4, 1),
      suspect('R1', 0.1, 1),
    ]);
    const next = (why: string): NextReading => ({
      take: 'ohms',
      label: why,
      bits: 1,
      minutes: 1,
      why,
    });
    const both = next('tells R1B open from V12 open');
    const none = next('tells V3 open from V4 open');
    expect(separatorsOf(group, [none, both])).toEqual([both]);
  });
});

describe('words of a suspect', () => {
  it('name a rule without its hyphens', () => {
    expect(ruleInWords('lamp-reads-well-cold')).toBe('Lamp reads well cold');
  });

  it('give the value it would need with its interval', () => {
    const fault = { part: 'R1', mode: 'high' as const };
    expect(
      neededValueInWords({ ...fault, value: 9.43, interval: [6.2, 18], valueUnit: 'factor' }),
    ).toBe('about 9.4 times its usual value, between 6.2 and 18 times');
    expect(
      neededValueInWords({ ...fault, value: 132, interval: [96, 210], valueUnit: 'ohms' }),
    ).toBe('about 132 Ω, between 96 Ω and 210 Ω');
    expect(neededValueInWords({ ...fault, volts: 6.3, amps: 0.6, types: ['6X4'] })).toBe(
      'a rating of 6.3 V, 600 mA (6X4)',
    );
    expect(neededValueInWords({ part: 'R1', mode: 'open' })).toBeNull();
  });

  it('say what a reading would show and how it speaks', () => {
    const evidence = { reading: 0, predicted: 118, low: 112, high: 121, times: 12, slip: false };
    expect(wouldShowInWords(evidence, { take: 'ac-volts' })).toBe('118 V (112 to 121 V)');
    expect(wouldShowInWords({ ...evidence, predicted: null }, { take: 'ohms' })).toBe('OL');
    expect(speaksInWords(evidence)).toBe('12 times more likely');
    expect(speaksInWords({ ...evidence, slip: true })).toBe('only as a slip of the reading');
  });
});
