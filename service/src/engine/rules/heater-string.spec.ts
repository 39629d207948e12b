import type { Netlist, Part } from '../netlist/types';
import { circuitOf, consoleString } from '../testing/circuits';
import { stringRefs } from './heater-string';

/** A heater string and a supply on one line, behind a common fuse. */
function wholeSet(): Netlist {
  const parts = [
    { ref: 'F1', kind: 'fuse', between: ['L', 'A'] },
    { ref: 'R1', kind: 'resistor', between: ['A', 'B'], ohms: 100 },
    { ref: 'V1', kind: 'heater', between: ['B', 'C'], volts: 35, amps: 0.15, cathode: 'K1' },
    { ref: 'V2', kind: 'heater', between: ['C', 'N'], volts: 50, amps: 0.15 },
    { ref: 'RK1', kind: 'resistor', between: ['K1', 'N'], ohms: 150 },
    { ref: 'R9', kind: 'resistor', between: ['A', 'P'], ohms: 47 },
    { ref: 'CR1', kind: 'rectifier', between: ['P', 'Q'] },
    { ref: 'C1', kind: 'capacitor', between: ['Q', 'N'], farads: 5e-5 },
    { ref: 'R10', kind: 'resistor', between: ['Q', 'S'], ohms: 1000 },
    { ref: 'R11', kind: 'resistor', between: ['S', 'N'], ohms: 33000 },
    { ref: 'R12', kind: 'resistor', between: ['Q', 'N'], ohms: 33000 },
  ] as Part[];
  return circuitOf(117, parts);
}

function refsOf(netlist: Netlist): string[] {
  return [...stringRefs(netlist)].sort();
}

describe('the heater string of a circuit', () => {
  it('holds what carries heater current: also the lamp across a section, not a cathode resistor', () => {
    expect(refsOf(consoleString())).toEqual(
      ['DS1', 'R1A', 'R1B', 'RT1', 'S1', 'V1', 'V2', 'V3'].sort(),
    );
  });

  it('ends where a supply begins', () => {
    expect(refsOf(wholeSet())).toEqual(['F1', 'R1', 'V1', 'V2']);
  });

  it('leaves out what lies across the line beside it', () => {
    const netlist = wholeSet();
    netlist.parts.push({ ref: 'RX', kind: 'resistor', between: ['L', 'N'], ohms: 5000 });
    expect(refsOf(netlist)).not.toContain('RX');
  });

  it('may hang on a winding instead of the line', () => {
    const parts = [
      { ref: 'LP', kind: 'resistor', between: ['L', 'N'], ohms: 5000 },
      { ref: 'T1', kind: 'winding', between: ['X', 'N'], volts: 25, ohms: 1 },
      { ref: 'V1', kind: 'heater', between: ['X', 'Y'], volts: 12.6, amps: 0.3 },
      { ref: 'V2', kind: 'heater', between: ['Y', 'N'], volts: 12.6, amps: 0.3 },
    ] as Part[];
    expect(refsOf(circuitOf(117, parts))).toEqual(['V1', 'V2']);
  });

  it('is empty where no current can reach a heater', () => {
    const netlist = wholeSet();
    netlist.parts = netlist.parts.filter(({ ref }) => ref !== 'R1');
    expect(refsOf(netlist)).toEqual([]);
  });
});
