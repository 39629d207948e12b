import type { Netlist } from '../../src/engine';

/** A small string that can be solved: a dropper and two heaters. */
export function buildNetlist(overrides: Partial<Netlist> = {}): Netlist {
  return {
    ohmstead: 1,
    title: 'Small string',
    reference: 'CHASSIS',
    line: { hot: 'L', return: 'CHASSIS', volts: 117, hertz: 60 },
    parts: [
      { ref: 'R1', kind: 'resistor', between: ['L', 'A'], ohms: 300, watts: 10, make: 'wirewound' },
      { ref: 'V1', kind: 'heater', between: ['A', 'B'], volts: 35, amps: 0.15, cathode: 'CHASSIS' },
      {
        ref: 'V2',
        kind: 'heater',
        between: ['B', 'CHASSIS'],
        volts: 35,
        amps: 0.15,
        cathode: 'CHASSIS',
      },
    ],
    points: [
      { node: 'A', label: 'V1 pin 3' },
      { node: 'B', label: 'V2 pin 3' },
    ],
    ...overrides,
  };
}
