import { Elimination } from './elimination';

describe('Elimination', () => {
  it('keeps every digit of 0.01 Ω beside 1 GΩ', () => {
    // Source: divider of 1 GΩ and 2 GΩ behind 0.01 Ω, hand working.
    const network = new Elimination(3, 0);
    network.add(0, -1, 1e6);
    network.add(0, 1, 100);
    network.add(1, 2, 1e-9);
    network.add(2, -1, 5e-10);
    network.factor();
    const amps = new Float64Array([1e6, 0, 0]);
    network.solve(amps, 1);
    expect(amps[0]).toBeCloseTo(1, 12);
    expect(amps[2]).toBeCloseTo(2e9 / (3e9 + 0.01), 14);
  });

  it('gives an unconnected node the least conductance to ground', () => {
    const network = new Elimination(1, 1e-12);
    network.factor();
    expect(network.solve(new Float64Array([1e-12]), 1)).toBeUndefined();
    const volts = new Float64Array([3e-12]);
    network.solve(volts, 1);
    expect(volts[0]).toBeCloseTo(3, 12);
  });
});
