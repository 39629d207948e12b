import type { BranchElement } from '../elements';

/** Short makers for the circuits of the specs; node 0 is the reference. */
export const resistance = (a: number, b: number, ohms: number): BranchElement => ({
  kind: 'resistance',
  a,
  b,
  ohms,
});
export const capacitor = (a: number, b: number, farads: number, esr = 0.1): BranchElement => ({
  kind: 'capacitor',
  a,
  b,
  farads,
  esr,
});
export const choke = (a: number, b: number, henries: number, ohms: number): BranchElement => ({
  kind: 'inductor',
  a,
  b,
  henries,
  ohms,
});
export const rectifier = (
  anode: number,
  cathode: number,
  dropVolts: number,
  ohms: number,
): BranchElement => ({ kind: 'rectifier', a: anode, b: cathode, dropVolts, ohms });
export const source = (
  a: number,
  b: number,
  volts: number,
  ohms = 0,
  phase: 0 | 180 = 0,
): BranchElement => ({ kind: 'source', a, b, volts, ohms, phase });
export const load = (
  a: number,
  b: number,
  amps: number,
  volts: number,
  exponent = 1,
): BranchElement => ({ kind: 'load', a, b, amps, volts, exponent });

/** A block ready to be solved. */
export interface Block {
  nodes: number;
  elements: BranchElement[];
}

/** Half-wave supply of a small receiver: dropper, vacuum rectifier, RC filter, a curved load. */
export const halfWave: Block = {
  nodes: 6,
  elements: [
    source(1, 0, 117),
    resistance(1, 2, 33),
    rectifier(2, 3, 10, 100),
    capacitor(3, 0, 50e-6, 2),
    load(3, 0, 0.034, 120, 1.5),
    resistance(3, 4, 1500),
    capacitor(4, 0, 30e-6, 2),
    load(4, 0, 0.016, 95),
    resistance(4, 5, 470e3),
    load(5, 0, 0.0001, 48),
    capacitor(2, 0, 47e-9),
  ],
};

/** Full-wave supply with condenser input, choke and a bleeder divider. */
export const fullWave: Block = {
  nodes: 6,
  elements: [
    source(1, 0, 330, 70),
    source(2, 0, 328, 74, 180),
    rectifier(1, 3, 14, 130),
    rectifier(2, 3, 14, 130),
    capacitor(3, 0, 20e-6, 2),
    choke(3, 4, 8, 210),
    capacitor(4, 0, 40e-6, 2),
    load(4, 0, 0.072, 365, 1.5),
    resistance(4, 5, 10e3),
    resistance(5, 0, 47e3),
    capacitor(5, 0, 20e-6, 2),
  ],
};

/** Half-wave doubler of a television set. */
export const doubler: Block = {
  nodes: 7,
  elements: [
    source(1, 0, 117),
    resistance(1, 2, 5),
    capacitor(2, 3, 150e-6, 2),
    rectifier(0, 3, 5, 10),
    rectifier(3, 4, 5, 10),
    capacitor(4, 0, 120e-6, 2),
    choke(4, 5, 1.2, 38),
    capacitor(5, 0, 100e-6, 2),
    load(5, 0, 0.16, 235),
    resistance(5, 6, 2700),
    capacitor(6, 0, 40e-6, 2),
    load(6, 0, 0.036, 140),
  ],
};

/**
 * Bridge on a floating winding. Its halves differ a little: with equal ones the peak of a waveform is
 * reached twice, and a derivative of it exists to one side only.
 */
export const bridge: Block = {
  nodes: 5,
  elements: [
    source(1, 2, 12, 0.5),
    rectifier(1, 3, 0.7, 0.1),
    rectifier(2, 3, 0.75, 0.1),
    rectifier(0, 1, 0.72, 0.1),
    rectifier(0, 2, 0.76, 0.1),
    capacitor(3, 0, 1e-3),
    resistance(3, 4, 10),
    capacitor(4, 0, 470e-6),
    load(4, 0, 0.3, 11),
  ],
};

/** Choke input, two filter sections. */
export const chokeInput: Block = {
  nodes: 6,
  elements: [
    source(1, 0, 350, 60),
    source(2, 0, 346, 62, 180),
    rectifier(1, 3, 14, 100),
    rectifier(2, 3, 14, 100),
    choke(3, 4, 8, 150),
    capacitor(4, 0, 16e-6, 2),
    choke(4, 5, 10, 200),
    capacitor(5, 0, 16e-6, 2),
    load(5, 0, 0.08, 280, 1.5),
    resistance(5, 0, 50e3),
  ],
};

/** Rectifiers return through a resistance to the chassis: the bias lies below node 0. */
export const backBias: Block = {
  nodes: 6,
  elements: [
    source(1, 5, 325, 70),
    source(2, 5, 325, 74, 180),
    rectifier(1, 3, 14, 130),
    rectifier(2, 3, 14, 130),
    capacitor(3, 5, 20e-6, 2),
    choke(3, 4, 8, 200),
    capacitor(4, 0, 40e-6, 2),
    resistance(5, 0, 150),
    capacitor(5, 0, 50e-6, 2),
    load(4, 0, 0.08, 350, 1.5),
  ],
};

/** Heater string and supply behind one line resistance, a thermistor in the string. */
export const heatersAndSupply: Block = {
  nodes: 7,
  elements: [
    source(1, 0, 117, 1),
    { kind: 'ntc', a: 1, b: 2, hotOhms: 40, coldOhms: 800, amps: 0.15, exponent: -1.2 },
    { kind: 'hot', a: 2, b: 3, volts: 35, amps: 0.15, exponent: 0.6, coldRatio: 6 },
    { kind: 'hot', a: 3, b: 4, volts: 50, amps: 0.15, exponent: 0.6, coldRatio: 6 },
    { kind: 'hot', a: 4, b: 0, volts: 12.6, amps: 0.15, exponent: 0.6, coldRatio: 6 },
    resistance(1, 5, 33),
    rectifier(5, 6, 10, 100),
    capacitor(6, 0, 50e-6, 2),
    load(6, 0, 0.05, 120, 1.5),
  ],
};

export const BLOCKS: Record<string, Block> = {
  'half-wave': halfWave,
  'full-wave': fullWave,
  doubler,
  bridge,
  'choke input': chokeInput,
  'back bias': backBias,
  'heaters and supply': heatersAndSupply,
};
