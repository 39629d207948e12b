import type { Part, PartKind } from '../netlist/types';
import { priorOdds } from './failure-rates';
import { modesOf } from './modes';

function part(kind: PartKind, more: object = {}): Part {
  return { ref: 'X1', kind, between: ['A', 'B'], cathode: 'K', ...more } as unknown as Part;
}

const KINDS: [string, Part][] = [
  ...(['composition', 'film', 'wirewound'] as const).map((make): [string, Part] => [
    `resistor, ${make}`,
    part('resistor', { make }),
  ]),
  ...(['electrolytic', 'paper', 'film', 'ceramic', 'mica'] as const).map((make): [string, Part] => [
    `capacitor, ${make}`,
    part('capacitor', { make }),
  ]),
  ...(['vacuum', 'selenium', 'silicon'] as const).map((make): [string, Part] => [
    `rectifier, ${make}`,
    part('rectifier', { make }),
  ]),
  ...(
    ['heater', 'lamp', 'thermistor', 'switch', 'fuse', 'joint', 'choke', 'winding', 'load'] as const
  ).map((kind): [string, Part] => [kind, part(kind)]),
];

function odds(of: Part, mode: string): number {
  const found = priorOdds(of).find((entry) => entry.mode === mode);
  if (!found) throw new Error(`${of.kind} has no odds for “${mode}”.`);
  return found.odds;
}

describe('prior odds', () => {
  it.each(KINDS)('of a %s cover every way it fails, each with a source', (_name, of) => {
    const entries = priorOdds(of);
    // Only a wet electrolyte dries: other makes gain no series resistance.
    const isDry = of.kind === 'capacitor' && of.make !== 'electrolytic';
    const ways = modesOf(of).filter((mode) => !(isDry && mode === 'high-esr'));
    expect(entries.map(({ mode }) => mode).sort()).toEqual(ways.sort());
    for (const { source } of entries) {
      expect(source).toMatch(/from memory|confirmed|assumed|common practice/);
    }
  });

  it.each(KINDS)('of a %s leave it far likelier good than bad', (_name, of) => {
    const all = priorOdds(of).reduce((sum, entry) => sum + entry.odds, 0);
    expect(all).toBeGreaterThan(0.003);
    expect(all).toBeLessThan(0.16);
  });

  it('follow the published order: wirewound before film, paper before film, open before the rest', () => {
    expect(odds(part('resistor', { make: 'wirewound' }), 'open')).toBeGreaterThan(
      odds(part('resistor', { make: 'film' }), 'open'),
    );
    expect(odds(part('capacitor', { make: 'paper' }), 'leaky')).toBeGreaterThan(
      10 * odds(part('capacitor', { make: 'film' }), 'leaky'),
    );
    expect(odds(part('heater'), 'open')).toBeGreaterThan(4 * odds(part('heater'), 'shorted'));
  });

  it('have composition resistors drift up, not down', () => {
    const composition = part('resistor', { make: 'composition' });
    expect(odds(composition, 'high')).toBeGreaterThan(10 * odds(composition, 'low'));
    expect(priorOdds(part('resistor'))).toEqual(priorOdds(composition));
  });

  it('suspect a picture tube of another type three times as often as another tube', () => {
    const plain = odds(part('heater', { tube: '12BA6' }), 'wrong-type');
    for (const tube of ['Picture tube', '21CBP4A', '21FBP22']) {
      expect(odds(part('heater', { tube }), 'wrong-type')).toBeCloseTo(3 * plain, 10);
    }
    expect(odds(part('heater', { tube: '1P5GT' }), 'wrong-type')).toBe(plain);
  });
});
