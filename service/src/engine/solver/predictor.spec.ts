import type { Netlist, Part, Reading } from '../netlist/types';
import { circuitOf, consoleString } from '../testing/circuits';
import { healthyValues } from './branch-values';
import { compileCircuit } from './circuit';
import { Predictor } from './predictor';
import { specOf } from './reading-spec';

function predict(netlist: Netlist, readings: Reading[], lineVolts?: number) {
  const circuit = compileCircuit(netlist, lineVolts);
  const predictor = new Predictor(circuit);
  const specs = readings.map((reading) => specOf(circuit, reading));
  return { circuit, out: predictor.predict(healthyValues(circuit), specs, [])! };
}

describe('the meter is part of the circuit', () => {
  const divider = circuitOf(100, [
    { ref: 'R1', kind: 'resistor', between: ['L', 'A'], ohms: 1e6 },
    { ref: 'R2', kind: 'resistor', between: ['A', 'N'], ohms: 1e6 },
  ]);

  it('a 20 kΩ/V movement on its 50 V range pulls a 1 MΩ divider from 50 to 33.3 V (divider with 1 MΩ across, worked by hand)', () => {
    const meter = { ohmsPerVolt: 20000, fullScale: 50 };
    const { out } = predict(divider, [{ take: 'ac-volts', at: ['A', 'N'], meter }]);
    expect(out.shown[0]).toBeCloseTo(100 / 3, 4);
  });

  it('a 10 MΩ meter reads 47.6 V there', () => {
    const { out } = predict(divider, [{ take: 'ac-volts', at: ['A', 'N'] }]);
    // 1 MΩ in parallel with 10 MΩ is 0.90909 MΩ.
    expect(out.shown[0]).toBeCloseTo((100 * 0.9090909) / 1.9090909, 4);
  });

  it('shows a voltage across an open part, which it completes', () => {
    const open: Netlist = circuitOf(117, [
      { ref: 'R1', kind: 'resistor', between: ['L', 'A'], ohms: 100 },
      { ref: 'J1', kind: 'joint', between: ['A', 'B'], ohms: 1e9 },
      { ref: 'R2', kind: 'resistor', between: ['B', 'N'], ohms: 100 },
    ]);
    const { out } = predict(open, [{ take: 'ac-volts', part: 'J1' }]);
    expect(out.shown[0]).toBeCloseTo(117, 1);
  });
});

describe('sensitivities', () => {
  const readings: Reading[] = [
    { take: 'ac-volts', at: ['C', 'N'] },
    { take: 'ac-volts', part: 'V2' },
    { take: 'amps', part: 'S1' },
    { take: 'ohms', at: ['D', 'N'] },
    { take: 'lifted-ohms', part: 'R1A' },
  ];

  /** The console string with one part's main value moved by a small share. */
  function moved(ref: string, by: number): Netlist {
    const netlist = consoleString();
    return {
      ...netlist,
      parts: netlist.parts.map((part): Part => {
        if (part.ref !== ref) return part;
        if (part.kind === 'resistor') return { ...part, ohms: part.ohms * (1 + by) };
        if (part.kind === 'heater' || part.kind === 'lamp')
          return { ...part, amps: part.amps * (1 + by) };
        if (part.kind === 'thermistor') return { ...part, hotOhms: part.hotOhms * (1 + by) };
        return part;
      }),
    };
  }

  it.each(['R1A', 'R1B', 'DS1', 'V1', 'V2', 'V3', 'RT1'])(
    'of %s agree with differences of full solutions',
    (ref) => {
      const by = 1e-4;
      const { circuit, out } = predict(consoleString(), readings, 117);
      const up = predict(moved(ref, by), readings, 117).out;
      const down = predict(moved(ref, -by), readings, 117).out;
      const column = circuit.valueParameter[circuit.partIndex.get(ref)!];
      readings.forEach((_, r) => {
        const difference = (up.mean[r] - down.mean[r]) / (2 * by);
        expect(out.sensitivity[r * out.width + column]).toBeCloseTo(difference, 3);
      });
    },
  );

  it('of the line agree too', () => {
    const by = 1e-4;
    const { circuit, out } = predict(consoleString(), readings, 117);
    const up = predict(consoleString(), readings, 117 * (1 + by)).out;
    const down = predict(consoleString(), readings, 117 * (1 - by)).out;
    readings.forEach((_, r) => {
      const difference = (up.mean[r] - down.mean[r]) / (2 * by);
      expect(out.sensitivity[r * out.width + circuit.lineParameter]).toBeCloseTo(difference, 3);
    });
  });
});
