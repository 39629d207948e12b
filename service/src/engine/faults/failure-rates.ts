import { isPictureTube } from '../netlist/picture-tube';
import type { CapacitorMake, FaultMode, Part, RectifierMake, ResistorMake } from '../netlist/types';

/** One way a part fails, its odds in a set that came in for repair, and where they come from. */
export interface PriorOdds {
  mode: FaultMode;
  odds: number;
  source: string;
}

/** A line of the failure-rate table. */
interface RateLine {
  /** Failures per million hours. */
  rate: number;
  /** How much likelier the part is to be bad at sixty years than the rate says. Assumption. */
  age: number;
  shares: Partial<Record<FaultMode, number>>;
  source: string;
}

const RATES =
  'MIL-HDBK-217F (2 Dec 1991), parts count, ground benign, read in a public restatement (confirmed there only)';
const SHARES = 'shares after MIL-HDBK-338B (1 Oct 1998), failure mode table (from memory)';
const ASSUMED = 'shares assumed: no published table was found';
const BENCH = 'bench faults of sixty-year-old sets (bridged, wrong type) assumed: common practice';

/**
 * Turns failures per million hours × age into odds that a part is bad in a set on the bench. One
 * scale for all kinds; chosen so that a tube heater comes out near 1 in 20. Only the order of
 * magnitude between kinds is published; the rest are stated assumptions.
 */
const SCALE = 1;

const RESISTORS: Record<ResistorMake, RateLine> = {
  composition: {
    rate: 0.0005,
    age: 120,
    // Published: drift 66 %, open 31 %, short 3 %; in old sets drift goes up.
    shares: { high: 0.62, low: 0.05, open: 0.27, bridged: 0.06 },
    source: `${RATES}; ${SHARES}; ${BENCH}`,
  },
  film: {
    rate: 0.0012,
    age: 20,
    shares: { open: 0.57, high: 0.24, low: 0.09, bridged: 0.1 },
    source: `${RATES}; ${SHARES}; ${BENCH}`,
  },
  wirewound: {
    rate: 0.014,
    age: 3.2,
    // Published: open 65 %, drift 26 %, short 9 %; power types in sets mostly burn open.
    shares: { open: 0.68, high: 0.17, low: 0.05, bridged: 0.1 },
    source: `${RATES}; ${SHARES}; ${BENCH}`,
  },
};

const CAPACITORS: Record<CapacitorMake, RateLine> = {
  electrolytic: {
    rate: 0.024,
    age: 6,
    // Published: short 53 %, open 35 %, leak 10 %, low 2 % for parts that fail in use. On the shelf
    // for decades they dry out and leak long before that.
    shares: { leaky: 0.3, shorted: 0.22, low: 0.22, 'high-esr': 0.18, open: 0.08 },
    source: `${RATES} (figure from memory); ${SHARES}; weights for age assumed`,
  },
  paper: {
    rate: 0.0036,
    age: 25,
    // Published: short 63 %, open 37 %; leakage is a partial short and dominates in waxed paper.
    shares: { leaky: 0.62, shorted: 0.26, open: 0.09, low: 0.03 },
    source: `${RATES}; ${SHARES}; leakage by bench experience (no share published)`,
  },
  film: {
    rate: 0.0021,
    age: 6,
    shares: { shorted: 0.4, open: 0.36, leaky: 0.14, low: 0.1 },
    source: `${RATES}; ${SHARES}`,
  },
  ceramic: {
    rate: 0.0036,
    age: 3,
    shares: { shorted: 0.4, leaky: 0.2, open: 0.22, low: 0.18 },
    source: `${RATES} (figure from memory); ${SHARES}`,
  },
  mica: {
    rate: 0.0005,
    age: 20,
    shares: { shorted: 0.5, leaky: 0.2, open: 0.15, low: 0.15 },
    source: `${RATES}; ${SHARES}`,
  },
};

const RECTIFIERS: Record<RectifierMake, RateLine> = {
  vacuum: {
    rate: 0.09,
    age: 1,
    shares: { weak: 0.6, open: 0.28, shorted: 0.08, leaky: 0.04 },
    source: `rate assumed from tube removals of 1 to 3 % per 100 h (ARINC study, early 1950s); ${ASSUMED}`,
  },
  selenium: {
    rate: 0.1,
    age: 1,
    shares: { weak: 0.6, shorted: 0.2, open: 0.12, leaky: 0.08 },
    source: `rate assumed; ${ASSUMED}`,
  },
  silicon: {
    rate: 0.0036,
    age: 6,
    shares: { shorted: 0.51, open: 0.29, leaky: 0.12, weak: 0.08 },
    source: `${RATES} (figure from memory); ${SHARES}`,
  },
};

const OTHERS = {
  heater: {
    rate: 0.06,
    age: 1,
    // Published for no heater; three in four of those that fail by themselves burn open.
    shares: { open: 0.66, 'heater-cathode-leak': 0.15, shorted: 0.07, 'wrong-type': 0.12 },
    source: `rate assumed from tube removals (ARINC study, early 1950s); ${ASSUMED}; ${BENCH}`,
  },
  lamp: {
    rate: 0.062,
    age: 1,
    shares: { open: 0.86, shorted: 0.03, 'wrong-type': 0.11 },
    source: `rate assumed: lamps are the shortest-lived part of a set (common practice); open and dim both count as open after ${SHARES}`,
  },
  thermistor: {
    rate: 0.065,
    age: 0.7,
    shares: { open: 0.66, high: 0.24, bridged: 0.1 },
    source: `${RATES}; ${SHARES}`,
  },
  switch: {
    rate: 0.02,
    age: 1.2,
    shares: { open: 0.55, 'poor-contact': 0.45 },
    source: `rate assumed; ${SHARES}`,
  },
  fuse: {
    rate: 0.01,
    age: 3.4,
    shares: { open: 0.88, 'poor-contact': 0.12 },
    source: `${RATES} (figure from memory); ${SHARES}; a blown fuse is a common find`,
  },
  joint: {
    rate: 0.005,
    age: 3,
    shares: { open: 0.6, 'poor-contact': 0.4 },
    source: `rate assumed; ${SHARES}`,
  },
  choke: {
    rate: 0.02,
    age: 1,
    shares: { open: 0.75, 'shorted-turns': 0.25 },
    source: `rate assumed; ${SHARES}, a short of all turns being rare`,
  },
  winding: {
    rate: 0.015,
    age: 1,
    shares: { open: 0.65, 'shorted-turns': 0.35 },
    source: `rate assumed; ${SHARES}`,
  },
  load: {
    rate: 0.04,
    age: 1,
    shares: { overload: 0.55, 'no-load': 0.45 },
    source: 'assumed: what a rail feeds fails about as often as one of its tubes',
  },
} satisfies Record<string, RateLine>;

/** A picture tube of another heater rating was a common stand-in; its line counts for more. */
const PICTURE_TUBE_WRONG_TYPE = 3;

function lineOf(part: Part): RateLine {
  switch (part.kind) {
    case 'resistor':
      return RESISTORS[part.make ?? 'composition'];
    case 'capacitor':
      return CAPACITORS[part.make ?? 'film'];
    case 'rectifier':
      return RECTIFIERS[part.make ?? 'silicon'];
    default:
      return OTHERS[part.kind];
  }
}

/**
 * Prior odds that a part is bad in each way, in a set that came in for repair: published failure
 * rate × share of the mode × age.
 */
export function priorOdds(part: Part): PriorOdds[] {
  const { rate, age, shares, source } = lineOf(part);
  return Object.entries(shares).map(([mode, share]) => ({
    mode: mode as FaultMode,
    odds:
      SCALE *
      rate *
      age *
      share *
      (mode === 'wrong-type' && isPictureTube(part) ? PICTURE_TUBE_WRONG_TYPE : 1),
    source,
  }));
}
