import type { DiagnosisInput } from '../diagnosis-types';
import type { Netlist, Part, Reading } from '../netlist/types';
import { circuitOf, consoleString } from '../testing/circuits';
import { evaluateRules } from './evaluate';
import type { Comparison, Conditions, Effect, Rule, RulesOutcome } from './types';

const ADVICE: Effect = { effect: 'advice', text: 'Look twice.' };

function rule(when: Conditions, overrides: Partial<Rule> = {}): Rule {
  return {
    id: 'test-rule',
    name: 'A rule',
    sentence: 'When it is so, look twice.',
    about: { scope: 'case' },
    when,
    then: [ADVICE],
    because: 'It is a test.',
    ...overrides,
  };
}

function is(fact: string, operator: string, value: unknown): Comparison {
  return { fact, operator, value };
}

function run(
  one: Rule,
  readings: Reading[] = [],
  more: Partial<DiagnosisInput> = {},
): Promise<RulesOutcome> {
  return evaluateRules({
    netlist: consoleString(),
    readings,
    knowledge: { rules: [one] },
    ...more,
  });
}

const OPEN: Reading = { take: 'ohms', part: 'R1A', value: 'OL' };

describe('a rule about the case', () => {
  const hums = is('isHumming', 'equal', true);
  const large = is('heaterCount', 'greaterThanInclusive', 3);
  const small = is('heaterCount', 'lessThan', 3);

  it('fires with the values it saw', async () => {
    const { fired, advice } = await run(rule({ all: [large] }));
    expect(fired).toEqual([{ rule: 'test-rule', seen: [{ fact: 'heaterCount', value: 3 }] }]);
    expect(advice).toEqual([
      { rule: 'test-rule', effect: 'advice', text: 'Look twice.', because: 'It is a test.' },
    ]);
  });

  // Rows of the truth tables for “and”, “or” and “not” with one term unknown.
  it.each<[string, Conditions, 'fires' | 'waits' | 'is silent']>([
    ['true and unknown', { all: [large, hums] }, 'waits'],
    ['false and unknown', { all: [small, hums] }, 'is silent'],
    ['true or unknown', { any: [large, hums] }, 'fires'],
    ['false or unknown', { any: [small, hums] }, 'waits'],
    ['not unknown', { not: { all: [hums] } }, 'waits'],
    ['not false', { not: { all: [small] } }, 'fires'],
    ['not true', { not: { all: [large] } }, 'is silent'],
    ['not (false and unknown)', { not: { all: [small, hums] } }, 'fires'],
  ])('on %s %s', async (_what, when, does) => {
    const { fired, waiting } = await run(rule(when));
    expect(fired).toHaveLength(does === 'fires' ? 1 : 0);
    expect(waiting).toEqual(
      does === 'waits' ? [{ rule: 'test-rule', for: 'whether the set hums' }] : [],
    );
  });

  it('is left out when the check refuses it', async () => {
    const broken = rule({ all: [is('moonPhase', 'equal', 1)] });
    expect(await run(broken)).toEqual({
      factors: [],
      causes: [],
      advice: [],
      waiting: [],
      fired: [],
    });
  });

  it('sees the line, the string current and the distance from published values', async () => {
    const netlist: Netlist = {
      ...consoleString(),
      points: [{ node: 'D', label: 'Lug D', published: { acVolts: 75 } }],
    };
    const when = {
      all: [
        is('lineRatio', 'greaterThan', 1.02),
        is('stringAmpsRatio', 'greaterThan', 1.05),
        is('publishedDeviation', 'greaterThan', 0.1),
      ],
    };
    const readings: Reading[] = [
      { take: 'amps', part: 'RT1', value: 0.33 },
      { take: 'ac-volts', at: ['D', 'N'], value: 60 },
    ];
    const { fired } = await run(rule(when), readings, {
      netlist,
      conditions: { lineVolts: 120.51 },
    });
    const seen = Object.fromEntries(fired[0].seen.map(({ fact, value }) => [fact, value]));
    expect(seen.lineRatio).toBeCloseTo(1.03, 6);
    // 330 mA in a string of 300 mA heaters; 60 V where 75 V are printed.
    expect(seen.stringAmpsRatio).toBeCloseTo(1.1, 6);
    expect(seen.publishedDeviation).toBeCloseTo(0.2, 6);
  });
});

describe('a rule about each part', () => {
  const speaksFor: Effect = {
    effect: 'speaks-for',
    parts: { isThis: true },
    mode: 'open',
    factor: 4,
  };
  const about = { scope: 'each-part', kind: ['resistor'] } as const;
  const each = (when: Conditions, then: Effect[] = [speaksFor]) =>
    rule(when, { about: { ...about, kind: [...about.kind] }, then });

  it('speaks for the part at hand alone, and waits in its name', async () => {
    const outcome = await run(each({ all: [is('isOpen', 'equal', true)] }), [OPEN]);
    expect(outcome.factors).toMatchObject([{ part: 'R1A', mode: 'open', factor: 4 }]);
    expect(outcome.waiting).toEqual([{ rule: 'test-rule', for: 'ohms across R1B' }]);
  });

  it('speaks against by the inverse of its factor', async () => {
    const against: Effect = { ...speaksFor, effect: 'speaks-against' } as Effect;
    const { factors } = await run(each({ all: [is('isOpen', 'equal', true)] }, [against]), [OPEN]);
    expect(factors).toMatchObject([{ part: 'R1A', factor: 0.25 }]);
  });

  it('takes a reading between the two ends of a part for one across it', async () => {
    const reading: Reading = { take: 'ohms', at: ['C', 'B'], value: 'OL' };
    const { factors } = await run(each({ all: [is('isOpen', 'equal', true)] }), [reading]);
    expect(factors.map(({ part }) => part)).toEqual(['R1A']);
  });

  it('goes by the lifted reading where both were taken', async () => {
    const readings: Reading[] = [
      { take: 'lifted-ohms', part: 'R1B', value: 'OL' },
      { take: 'ohms', part: 'R1B', value: 4.1 },
    ];
    const { factors } = await run(each({ all: [is('isOpen', 'equal', true)] }), readings);
    expect(factors.map(({ part }) => part)).toEqual(['R1B']);
  });

  it('counts OL as the most that the meter shows', async () => {
    const when = { all: [is('ohmsRatio', 'greaterThan', 2)] };
    const { fired } = await run(each(when), [OPEN]);
    expect(fired).toMatchObject([{ part: 'R1A' }]);
    expect(fired[0].seen[0].value).toBeCloseTo(2e7 / 68, 3);
  });

  it('has nothing to say, and waits for nothing, where a question makes no sense', async () => {
    const of = (when: Conditions) =>
      rule(when, { about: { scope: 'each-part', kind: ['heater'] } });
    for (const when of [
      { all: [is('make', 'equal', 'wirewound')] },
      { not: { all: [is('make', 'equal', 'wirewound')] } },
      { all: [is('ratedWatts', 'greaterThan', 1), is('seen', 'equal', 'dark')] },
    ] as Conditions[]) {
      expect(await run(of(when))).toMatchObject({ fired: [], waiting: [] });
    }
  });

  it('knows the default make of the format, and what was found', async () => {
    const when = {
      all: [is('make', 'equal', 'composition'), is('asFound', 'equal', 'value')],
    };
    const netlist = circuitOf(117, [
      { ref: 'R1', kind: 'resistor', between: ['L', 'A'], ohms: 100 },
      { ref: 'R2', kind: 'resistor', between: ['A', 'N'], ohms: 100 },
    ]);
    const { fired } = await run(each(when), [], {
      netlist,
      asFound: [{ part: 'R2', change: 'value', ohms: 120 }],
    });
    expect(fired).toMatchObject([{ part: 'R2' }]);
  });

  it('compares healthy watts with the rating', async () => {
    // 117 V across 100 Ω + 100 Ω: 34.2 W in each.
    const parts: Part[] = [
      { ref: 'R1', kind: 'resistor', between: ['L', 'A'], ohms: 100, watts: 50 },
      { ref: 'R2', kind: 'resistor', between: ['A', 'N'], ohms: 100, watts: 20 },
      { ref: 'R3', kind: 'resistor', between: ['A', 'N'], ohms: 1e9 },
    ];
    const outcome = await run(each({ all: [is('wattsRatio', 'greaterThan', 1)] }), [], {
      netlist: circuitOf(117, parts),
    });
    expect(outcome.fired).toMatchObject([{ part: 'R2' }]);
    expect(outcome.fired[0].seen[0].value).toBeCloseTo(117 ** 2 / 400 / 20, 4);
    expect(outcome.waiting).toEqual([{ rule: 'test-rule', for: 'R3’s rated watts' }]);
  });

  it('can mean the lamp across the part at hand', async () => {
    const then: Effect[] = [
      { effect: 'speaks-for', parts: { isAcrossThis: true }, mode: 'open', factor: 2 },
    ];
    const { factors } = await run(each({ all: [is('lampsAcross', 'equal', 1)] }, then));
    expect(factors.map(({ part }) => part)).toEqual(['DS1']);
  });
});

describe('a cause', () => {
  const cause = (parts: object): Effect => ({
    effect: 'cause',
    name: 'Surge',
    probability: 0.02,
    members: [{ parts, mode: 'open', probability: 0.5 }],
  });

  it('ties the parts together that its selectors mean', async () => {
    const when: Conditions = { all: [is('hasLine', 'equal', true)] };
    const { causes } = await run(
      rule(when, { then: [cause({ isInString: true, kind: ['resistor', 'thermistor'] })] }),
    );
    expect(causes).toEqual([
      {
        name: 'Surge',
        rule: 'test-rule',
        because: 'It is a test.',
        probability: 0.02,
        members: ['RT1', 'R1A', 'R1B'].map((part) => ({ part, mode: 'open', probability: 0.5 })),
      },
    ]);
  });

  it('of a single part is none', async () => {
    const when: Conditions = { all: [is('hasLine', 'equal', true)] };
    expect((await run(rule(when, { then: [cause({ ref: 'R1A' })] }))).causes).toEqual([]);
  });

  it('is stated once for each body', async () => {
    const can = (ref: string, assembly: string, node: string): Part => ({
      ref,
      kind: 'capacitor',
      between: [node, 'N'],
      farads: 1e-5,
      make: 'electrolytic',
      assembly,
    });
    const netlist = circuitOf(117, [
      { ref: 'R1', kind: 'resistor', between: ['L', 'A'], ohms: 100, assembly: 'R1' },
      { ref: 'R2', kind: 'resistor', between: ['A', 'N'], ohms: 100 },
      can('C1A', 'C1', 'A'),
      can('C2A', 'C2', 'A'),
      can('C1B', 'C1', 'L'),
      can('C2B', 'C2', 'L'),
      can('C3', 'C3', 'L'),
    ]);
    const dried: Effect = {
      effect: 'cause',
      name: 'Dried',
      probability: 0.01,
      members: [{ parts: { assembly: 'same' }, mode: 'low', probability: 0.4 }],
    };
    const about = { scope: 'each-body' } as const;
    const { causes } = await run(
      rule({ all: [is('make', 'equal', 'electrolytic')] }, { about, then: [dried] }),
      [],
      { netlist },
    );
    expect(causes.map(({ members }) => members.map(({ part }) => part))).toEqual([
      ['C1A', 'C1B'],
      ['C2A', 'C2B'],
    ]);
  });
});
