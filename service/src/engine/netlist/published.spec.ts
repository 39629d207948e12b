import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { compare } from '../compare';
import { readNetlist } from './read';
import type { Netlist } from './types';

const FOLDER = join(__dirname, '..', '..', '..', '..', 'netlists');
const families = JSON.parse(readFileSync(join(FOLDER, 'families.json'), 'utf8')) as object;
const CIRCUITS = Object.keys(families).map((name): [string, Netlist] => [
  name,
  readNetlist(JSON.parse(readFileSync(join(FOLDER, name), 'utf8'))),
]);

describe('published values of the circuits that ship', () => {
  it.each(CIRCUITS)('%s agree with what the engine computes', async (_name, netlist) => {
    const points = await compare({ netlist, readings: [] });
    const printed = points.filter(({ published }) => published !== undefined);
    const count = (netlist.points ?? []).flatMap(({ published }) => Object.keys(published ?? {}));
    // Every printed value finds its place, and a sheet has several of them.
    expect(printed).toHaveLength(count.length);
    expect(count.length).toBeGreaterThanOrEqual(4);
    for (const { label, take, value, published } of printed) {
      const share = Math.abs(published! / value! - 1);
      expect([label, take, share < 0.03 ? 'agrees' : `${value} against ${published}`]).toEqual([
        label,
        take,
        'agrees',
      ]);
    }
  });
});
