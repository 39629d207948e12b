import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Conditions, Netlist, Reading } from '../src/engine';

/** A set with known faults. */
export interface BenchCase {
  id: string;
  /** Circuit, from the id: everything before the last two numbers. */
  circuit: string;
  netlist: Netlist;
  conditions: Conditions;
  readings: Reading[];
  truth: { part: string; mode: string }[];
  /** What the meter shows for any reading asked for; only step cases have it. */
  answers?: Record<string, number | 'OL'>;
}

/** Reads all cases of a folder, in the order of their names. */
export function readCases(folder: string): BenchCase[] {
  return readdirSync(folder)
    .filter((name) => name.endsWith('.json'))
    .sort()
    .map((name) => {
      const data = JSON.parse(readFileSync(join(folder, name), 'utf8')) as Omit<
        BenchCase,
        'circuit'
      >;
      return { ...data, circuit: data.id.replace(/(-\d+){1,2}(\.step)?$/, '') };
    });
}

/** Name of a fault set, whatever its order. */
export function faultKey(faults: readonly { part: string; mode: string }[]): string {
  return faults
    .map(({ part, mode }) => `${part}:${mode}`)
    .sort()
    .join('|');
}
