/**
 * One two-terminal element of a block, between two integer nodes; node 0 is the block's reference.
 * Current counts from `a` through the element to `b`. SI units throughout.
 */
export type BranchElement =
  | { kind: 'resistance'; a: number; b: number; ohms: number }
  | { kind: 'capacitor'; a: number; b: number; farads: number; esr: number }
  | { kind: 'inductor'; a: number; b: number; henries: number; ohms: number }
  /** `a` is the anode. Conducts above `dropVolts` through `ohms`; blocked it is `reverseOhms`, 10 GΩ if left out. */
  | {
      kind: 'rectifier';
      a: number;
      b: number;
      dropVolts: number;
      ohms: number;
      reverseOhms?: number;
    }
  /** Sine of `volts` RMS, `a` positive in the first half cycle for phase 0; `ohms` may be 0. */
  | { kind: 'source'; a: number; b: number; volts: number; phase: 0 | 180; ohms: number }
  /** I = amps·(V/volts)^exponent of the average V; a fixed conductance within the cycle. */
  | { kind: 'load'; a: number; b: number; amps: number; volts: number; exponent: number }
  /** Heater or lamp: I = amps·(V/volts)^exponent of RMS values, never below its cold resistance. */
  | {
      kind: 'hot';
      a: number;
      b: number;
      volts: number;
      amps: number;
      exponent: number;
      coldRatio: number;
    }
  /** R = hotOhms·(I/amps)^exponent of the RMS current, held between hotOhms/3 and coldOhms. */
  | {
      kind: 'ntc';
      a: number;
      b: number;
      hotOhms: number;
      coldOhms: number;
      amps: number;
      exponent: number;
    };

/** An element of one kind. */
export type ElementOf<K extends BranchElement['kind']> = Extract<BranchElement, { kind: K }>;

/**
 * Limits that keep the equations solvable without being seen in a reading. A person may draw a
 * capacitor straight across the line, or a choke that every rectifier cuts off.
 */
export const LIMITS = {
  /** From every node to the reference, so that a floating island still has a voltage. */
  leastSiemens: 1e-12,
  /** Series resistance of a capacitor, as a fraction of its reactance at line frequency. */
  leastEsr: 1e-5,
  /** Resistance across a choke's inductance (core loss), in multiples of its reactance. */
  chokeLoss: 1e3,
  /** Leakage of a blocked rectifier; without it a bridge's floating source has no voltage of its own. */
  blockedSiemens: 1e-10,
  leastOhms: 1e-6,
  leastRectifierOhms: 1e-3,
} as const;
