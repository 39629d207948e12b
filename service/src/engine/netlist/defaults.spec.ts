import { withDefaults } from './defaults';
import type { Part } from './types';

function filled(fields: object): Part {
  return withDefaults({ ref: 'X1', between: ['A', 'B'], ...fields } as Part);
}

describe('defaults of the netlist format', () => {
  // Expected values: the table of kinds in netlists/README.md.
  it.each<[object, object]>([
    [
      { kind: 'resistor', ohms: 10 },
      { tolerance: 0.1, make: 'composition' },
    ],
    [
      { kind: 'heater', volts: 6.3, amps: 0.3 },
      { tolerance: 0.05, coldRatio: 6, exponent: 0.6 },
    ],
    [
      { kind: 'lamp', volts: 6.3, amps: 0.15 },
      { tolerance: 0.1, coldRatio: 10, exponent: 0.55 },
    ],
    [
      { kind: 'thermistor', hotOhms: 20, coldOhms: 180, amps: 0.45 },
      { tolerance: 0.15, exponent: -1.2 },
    ],
    [{ kind: 'fuse' }, { ohms: 0.05 }],
    [
      { kind: 'capacitor', farads: 1e-7 },
      { tolerance: 0.2, make: 'film', esr: 0.1 },
    ],
    [{ kind: 'capacitor', farads: 1e-5, make: 'electrolytic' }, { esr: 2 }],
    [{ kind: 'rectifier' }, { make: 'silicon', dropVolts: 0.7, ohms: 0.1 }],
    [
      { kind: 'rectifier', make: 'vacuum' },
      { dropVolts: 10, ohms: 100 },
    ],
    [
      { kind: 'rectifier', make: 'selenium' },
      { dropVolts: 5, ohms: 10 },
    ],
    [{ kind: 'choke', henries: 8, ohms: 200 }, { tolerance: 0.1 }],
    [{ kind: 'winding', volts: 330, ohms: 70 }, { phase: 0 }],
    [
      { kind: 'load', amps: 0.1, volts: 200 },
      { tolerance: 0.2, exponent: 1 },
    ],
  ])('%j', (fields, expected) => {
    expect(filled(fields)).toMatchObject(expected);
  });

  it('give way to what the drawing states, and leave the part itself alone', () => {
    const part = { ref: 'R1', kind: 'resistor', between: ['A', 'B'], ohms: 1, tolerance: 0.05 };
    expect(withDefaults(part as Part)).toMatchObject({ tolerance: 0.05, make: 'composition' });
    expect(part).not.toHaveProperty('make');
  });
});
