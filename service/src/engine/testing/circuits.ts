import type { Netlist, Part } from '../netlist/types';

/** Resistors in one string from L to N, named R1, R2, …; nodes N1, N2, … between them. */
export function series(volts: number, ohms: readonly number[]): Netlist {
  return stringOf(
    volts,
    ohms.map((value, i) => ({
      ref: `R${i + 1}`,
      kind: 'resistor',
      between: ['', ''],
      ohms: value,
    })),
  );
}

/** Puts parts end to end from L to N; their own nodes are overwritten. */
export function stringOf(volts: number, parts: readonly Part[]): Netlist {
  const last = parts.length - 1;
  return {
    ohmstead: 1,
    title: 'String under test',
    reference: 'N',
    line: { hot: 'L', return: 'N', volts, hertz: 60 },
    parts: parts.map((part, i) => ({
      ...part,
      between: [i === 0 ? 'L' : `N${i}`, i === last ? 'N' : `N${i + 1}`] as [string, string],
    })),
  };
}

/** A circuit of any parts on a line from L to N. */
export function circuitOf(
  volts: number,
  parts: readonly Part[],
  more: Partial<Netlist> = {},
): Netlist {
  return {
    ohmstead: 1,
    title: 'Circuit under test',
    reference: 'N',
    line: { hot: 'L', return: 'N', volts, hertz: 60 },
    parts: [...parts],
    ...more,
  };
}

/** A heater by its rating, as tube manuals give it. */
export function heater(ref: string, volts: number, amps: number, more: Partial<Part> = {}): Part {
  return { ref, kind: 'heater', between: ['', ''], volts, amps, ...more } as Part;
}

/** A small console string with a two-section dropper, a lamp across one section and a thermistor. */
export function consoleString(): Netlist {
  return circuitOf(
    117,
    [
      { ref: 'S1', kind: 'switch', between: ['L', 'A'] },
      {
        ref: 'RT1',
        kind: 'thermistor',
        between: ['A', 'B'],
        hotOhms: 20,
        coldOhms: 180,
        amps: 0.3,
      },
      {
        ref: 'R1A',
        kind: 'resistor',
        between: ['B', 'C'],
        ohms: 68,
        watts: 10,
        make: 'wirewound',
        assembly: 'R1',
      },
      {
        ref: 'R1B',
        kind: 'resistor',
        between: ['C', 'D'],
        ohms: 33,
        watts: 7,
        make: 'wirewound',
        assembly: 'R1',
      },
      { ref: 'DS1', kind: 'lamp', between: ['C', 'D'], volts: 6.3, amps: 0.15 },
      { ref: 'V1', kind: 'heater', between: ['D', 'E'], volts: 25, amps: 0.3, cathode: 'N' },
      { ref: 'V2', kind: 'heater', between: ['E', 'F'], volts: 25, amps: 0.3, cathode: 'K2' },
      { ref: 'RK2', kind: 'resistor', between: ['K2', 'N'], ohms: 180, make: 'composition' },
      { ref: 'V3', kind: 'heater', between: ['F', 'N'], volts: 25, amps: 0.3, cathode: 'N' },
    ],
    { points: ['A', 'B', 'C', 'D', 'E', 'F'].map((node) => ({ node, label: `Lug ${node}` })) },
  );
}

/** Repeatable numbers between 0 and 1: a linear congruential generator (Numerical Recipes constants). */
export function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 4294967296;
  };
}
