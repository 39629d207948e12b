import { consoleString, halfWaveSupply } from '@/testing/fixtures/circuits';
import { describe, expect, it } from 'vitest';
import { type GridSection, placesOf, sectionsOf } from './grid-model';

function rowOf(section: GridSection, label: string) {
  const row = section.rows.find((one) => one.label === label);
  if (!row) throw new Error(`no row ${label}`);
  return row;
}

describe('the rows of the readings grid', () => {
  it('puts what is read with the power off first', () => {
    expect(sectionsOf(consoleString).map(({ title }) => title)).toEqual(['Power off', 'Powered']);
  });

  it('offers ohms at points and parts, lifting and looking at parts only', () => {
    const [cold] = sectionsOf(consoleString);
    expect(rowOf(cold, 'Dropper lug 2').cells).toEqual({
      ohms: { take: 'ohms', at: ['B3', 'CHASSIS'] },
    });
    expect(Object.keys(rowOf(cold, 'R1B').cells)).toEqual(['ohms', 'lifted-ohms', 'sign']);
  });

  it('offers no DC on a heater string, and DC with ripple behind a rectifier', () => {
    const [, powered] = sectionsOf(consoleString);
    expect(powered.columns).toEqual(['ac-volts', 'amps', 'sign']);
    const [, supply] = sectionsOf(halfWaveSupply);
    expect(supply.columns).toEqual(['ac-volts', 'dc-volts', 'ripple-volts', 'amps', 'sign']);
  });

  it('offers the line itself first', () => {
    const [, powered] = sectionsOf(consoleString);
    expect(powered.rows[0]).toMatchObject({ label: 'The line', id: 'point L' });
  });

  it('adds a row for leads on two other nodes, once', () => {
    const place = { take: 'ac-volts', at: ['B3', 'B4'] } as const;
    const [, powered] = sectionsOf(consoleString, [
      { take: place.take, at: ['B3', 'B4'] },
      { take: place.take, at: ['B3', 'B4'] },
    ]);
    const rows = powered.rows.filter(({ kind }) => kind === 'leads');
    expect(rows).toHaveLength(1);
    expect(rows[0].label).toBe('Dropper lug 2 to Dropper lug 3');
  });

  it('lists each place once', () => {
    for (const section of sectionsOf(halfWaveSupply)) {
      const keys = placesOf(section).map((place) => JSON.stringify(place));
      expect(new Set(keys).size).toBe(keys.length);
    }
  });
});
