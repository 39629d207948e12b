import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { DiagnosisInput } from '../diagnosis-types';
import type { Netlist, Part, Reading, Seen } from '../netlist/types';
import { circuitOf, consoleString } from '../testing/circuits';
import { evaluateRules } from './evaluate';
import type { Rule } from './types';

const FOLDER = join(__dirname, '..', '..', '..', '..', 'rules');
const RULES = readdirSync(FOLDER, { withFileTypes: true })
  .filter((entry) => entry.isDirectory())
  .flatMap(({ name: pack }) =>
    readdirSync(join(FOLDER, pack)).map(
      (name) => JSON.parse(readFileSync(join(FOLDER, pack, name), 'utf8')) as Rule,
    ),
  );

type Situation = Omit<DiagnosisInput, 'knowledge'>;

/** A set fed by a transformer, with one heater and nothing remarkable. */
const PLAIN: Netlist = circuitOf(
  117,
  [
    { ref: 'LP', kind: 'resistor', between: ['L', 'N'], ohms: 5000, make: 'film' },
    { ref: 'T1', kind: 'winding', between: ['X', 'CHASSIS'], volts: 6.3, ohms: 0.1 },
    { ref: 'V1', kind: 'heater', between: ['X', 'CHASSIS'], volts: 6.3, amps: 0.3 },
  ],
  { reference: 'CHASSIS' },
);

/** A supply with a fuse, a surge resistor, selenium, a two-section can and paper. */
const SUPPLY: Netlist = circuitOf(117, [
  { ref: 'F1', kind: 'fuse', between: ['L', 'A'] },
  { ref: 'C9', kind: 'capacitor', between: ['A', 'N'], farads: 5e-8, make: 'paper' },
  { ref: 'R1', kind: 'resistor', between: ['A', 'B'], ohms: 5.6, make: 'wirewound' },
  { ref: 'SR1', kind: 'rectifier', between: ['B', 'P'], make: 'selenium' },
  electrolytic('C1A', 'P'),
  { ref: 'R2', kind: 'resistor', between: ['P', 'Q'], ohms: 1000 },
  electrolytic('C1B', 'Q'),
  { ref: 'R3', kind: 'resistor', between: ['Q', 'S'], ohms: 220e3 },
  { ref: 'LD1', kind: 'load', between: ['S', 'N'], amps: 2e-4, volts: 60 },
]);

function electrolytic(ref: string, node: string): Part {
  return {
    ref,
    kind: 'capacitor',
    between: [node, 'N'],
    farads: 4e-5,
    make: 'electrolytic',
    assembly: 'C1',
  };
}

function withPictureTube(): Netlist {
  const netlist = consoleString();
  const parts = netlist.parts.map((part) =>
    part.ref === 'V2' ? ({ ...part, tube: 'Picture tube' } as Part) : part,
  );
  return { ...netlist, parts };
}

function on(netlist: Netlist, readings: Reading[] = [], more: Partial<Situation> = {}): Situation {
  return { netlist, readings, ...more };
}

function saw(part: string, seen: Seen): Reading {
  return { take: 'sign', part, seen };
}

function ohms(part: string, value: number | 'OL'): Reading {
  return { take: 'ohms', part, value };
}

function printed(acVolts: number): Netlist {
  return { ...consoleString(), points: [{ node: 'D', label: 'Lug D', published: { acVolts } }] };
}

const LUG_D: Reading = { take: 'ac-volts', at: ['D', 'N'], value: 70 };

/** For every rule a situation in which it speaks, and one in which it must not. */
const SITUATIONS: Record<string, { speaks: Situation; silent: Situation }> = {
  'bulging-electrolytic': {
    speaks: on(SUPPLY, [saw('C1A', 'bulging')]),
    silent: on(SUPPLY, [saw('C1A', 'looks-good')]),
  },
  'can-sections-dry-together': { speaks: on(SUPPLY), silent: on(consoleString()) },
  'composition-drifts-high': { speaks: on(SUPPLY), silent: on(consoleString()) },
  'dried-can': { speaks: on(SUPPLY), silent: on(consoleString()) },
  'fuse-blew-for-a-reason': {
    speaks: on(SUPPLY, [ohms('F1', 'OL')]),
    silent: on(SUPPLY, [ohms('F1', 0.2)]),
  },
  'paper-capacitors-leak': { speaks: on(SUPPLY), silent: on(PLAIN) },
  'selenium-ages': { speaks: on(SUPPLY), silent: on(PLAIN) },
  'short-takes-the-protection-along': { speaks: on(SUPPLY), silent: on(consoleString()) },
  'surge-at-switch-on': { speaks: on(SUPPLY), silent: on(consoleString()) },
  'bridged-section-overloads-heaters': {
    speaks: on(consoleString(), [], { asFound: [{ part: 'R1A', change: 'bridged' }] }),
    silent: on(consoleString(), [], { asFound: [{ part: 'RT1', change: 'missing' }] }),
  },
  'burnt-dropper-section': {
    speaks: on(consoleString(), [saw('R1A', 'burnt')]),
    silent: on(consoleString(), [saw('RK2', 'burnt')]),
  },
  'dark-lamp-is-open': {
    speaks: on(consoleString(), [saw('DS1', 'dark')]),
    silent: on(consoleString(), [saw('DS1', 'glows')]),
  },
  'dropper-is-one-body': {
    speaks: on(consoleString(), [ohms('R1B', 'OL')]),
    silent: on(consoleString(), [ohms('R1B', 33)]),
  },
  'high-line-strains-the-string': {
    speaks: on(consoleString(), [], { conditions: { lineVolts: 125 } }),
    silent: on(consoleString(), [], { conditions: { lineVolts: 119 } }),
  },
  'hum-from-heater-leak': {
    speaks: on(consoleString(), [saw('V1', 'hums')]),
    silent: on(consoleString(), [saw('V1', 'warm')]),
  },
  'lamp-across-open-section': {
    speaks: on(consoleString(), [ohms('R1B', 'OL')]),
    silent: on(consoleString(), [ohms('R1A', 'OL')]),
  },
  'lamp-reads-well-cold': {
    speaks: on(consoleString(), [ohms('DS1', 4.1)]),
    silent: on(consoleString(), [ohms('DS1', 'OL')]),
  },
  'picture-tube-with-bridged-dropper': {
    speaks: on(withPictureTube()),
    silent: on(consoleString()),
  },
  'published-values-need-the-line': {
    speaks: on(printed(75), [LUG_D], { conditions: { lineVolts: 110 } }),
    silent: on(printed(75), [LUG_D], { conditions: { lineVolts: 117 } }),
  },
  'section-takes-its-lamp-along': { speaks: on(consoleString()), silent: on(SUPPLY) },
  'string-current-above-rating': {
    speaks: on(consoleString(), [{ take: 'amps', part: 'S1', value: 0.34 }]),
    silent: on(consoleString(), [{ take: 'amps', part: 'S1', value: 0.3 }]),
  },
  'surge-opens-the-string': { speaks: on(consoleString()), silent: on(SUPPLY) },
  'charged-capacitors': { speaks: on(SUPPLY), silent: on(consoleString()) },
  'cracked-glass': {
    speaks: on(consoleString(), [saw('V1', 'cracked')]),
    silent: on(SUPPLY, [saw('SR1', 'cracked')]),
  },
  'hot-chassis': { speaks: on(consoleString()), silent: on(PLAIN) },
  'line-capacitor-class': { speaks: on(SUPPLY), silent: on(consoleString()) },
  'picture-tube-care': { speaks: on(withPictureTube()), silent: on(consoleString()) },
  'selenium-fumes': { speaks: on(SUPPLY), silent: on(PLAIN) },
};

describe('every rule that ships', () => {
  it('has its situations here, and its id is its own', () => {
    expect(RULES.map(({ id }) => id).sort()).toEqual(Object.keys(SITUATIONS).sort());
  });

  it.each(RULES.map((rule): [string, Rule] => [rule.id, rule]))('%s', async (id, rule) => {
    const { speaks, silent } = SITUATIONS[id];
    const knowledge = { rules: [rule] };
    const said = await evaluateRules({ ...speaks, knowledge });
    const effects = [
      ...said.advice.map(({ effect }) => effect),
      ...said.factors.map(({ factor }) => (factor > 1 ? 'speaks-for' : 'speaks-against')),
      ...said.causes.map(() => 'cause'),
    ];
    // Every effect of the rule must find something to say.
    expect([...new Set(effects)].sort()).toEqual(
      [...new Set(rule.then.map(({ effect }) => effect))].sort(),
    );
    const kept = await evaluateRules({ ...silent, knowledge });
    expect(kept).toMatchObject({ factors: [], causes: [], advice: [], fired: [] });
  });

  it('speaks in full sentences that end', () => {
    for (const { sentence, because, then } of RULES) {
      const texts = then.flatMap((effect) => ('text' in effect ? [effect.text] : []));
      for (const text of [sentence, because, ...texts]) expect(text).toMatch(/^\p{Lu}.*\.$/u);
    }
  });
});
