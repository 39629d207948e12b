import { type AsFound, type Netlist, type Part } from '@engine/netlist/types';

/** How a part of this set differs from its drawing. */
export type Difference = 'fitted' | 'value' | 'bridged' | 'missing' | 'added';

/** Words for a difference, after the part's value. */
export const DIFFERENCE_WORDS: Record<Difference, string> = {
  fitted: 'another one fitted',
  value: 'another value',
  bridged: 'bridged',
  missing: 'missing',
  added: 'added',
};

/**
 * Makes the circuit as it is drawn: added parts in it, fitted values on their parts, nothing removed.
 *
 * @param netlist the family's circuit.
 * @param asFound how this set differs; entries for unknown parts are left out.
 * @returns the circuit to draw and the difference by part.
 */
export function netlistAsFound(
  netlist: Netlist,
  asFound: readonly AsFound[] = [],
): { netlist: Netlist; differences: Map<string, Difference> } {
  const differences = new Map<string, Difference>();
  const parts: Part[] = [...netlist.parts];
  for (const entry of asFound) {
    if (entry.change === 'added') {
      if (parts.some((part) => part.ref === entry.add.ref)) continue;
      parts.push(entry.add);
      differences.set(entry.add.ref, 'added');
      continue;
    }
    const index = parts.findIndex((part) => part.ref === entry.part);
    if (index < 0) continue;
    differences.set(entry.part, entry.change);
    if (entry.change === 'fitted' || entry.change === 'value') {
      const { part: _part, change: _change, ...fields } = entry;
      // Another rating without a type: the old type on the drawing would be wrong.
      const named = parts[index].kind === 'heater' ? { tube: undefined } : {};
      parts[index] = { ...parts[index], ...named, ...fields } as Part;
    }
  }
  return { netlist: { ...netlist, parts }, differences };
}
