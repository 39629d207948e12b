import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { checkRule, type Knowledge } from '../engine';
import lampData from '../parts-data/lamps.json';
import tubeData from '../parts-data/tubes.json';

/** Folder of the rule packs, seen from the built file. */
const RULES = join(__dirname, '..', '..', '..', '..', 'rules');

function rulesIn(folder: string): unknown[] {
  return readdirSync(folder, { withFileTypes: true })
    .filter((entry) => entry.isDirectory())
    .flatMap((pack) =>
      readdirSync(join(folder, pack.name))
        .filter((name) => name.endsWith('.json'))
        .sort()
        .map((name) => JSON.parse(readFileSync(join(folder, pack.name, name), 'utf8')) as unknown),
    );
}

/**
 * What the shop knows before it has solved a case: tube and lamp ratings and the rule packs shipped
 * with the project. Needs no database. A rule that does not pass its check is left out.
 */
export function shippedKnowledge(): Knowledge {
  return {
    tubes: tubeData.tubes.map(({ type, heaterVolts, heaterAmps }) => ({
      type,
      volts: heaterVolts,
      amps: heaterAmps,
    })),
    lamps: lampData.lamps.map(({ type, volts, amps }) => ({ type, volts, amps })),
    rules: rulesIn(RULES).filter((rule) => checkRule(rule).length === 0),
  };
}
