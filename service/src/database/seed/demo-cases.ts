import type { AsFound, FaultMode, Reading } from '../../engine';
import type { CaseState, Outcome } from '../../cases/case.model';

/** One case of the demo shop. */
export interface DemoCase {
  family: string;
  set: string;
  complaint: string;
  earlierWork?: string;
  state: CaseState;
  lineVolts: number;
  daysAgo: number;
  asFound?: AsFound[];
  readings: Reading[];
  outcome?: Outcome;
  faults?: { part: string; mode: FaultMode }[];
  note?: string;
}

const CHASSIS = 'CHASSIS';
const MINUS = 'BMINUS';

function ac(node: string, value: number, black = CHASSIS): Reading {
  return { take: 'ac-volts', at: [node, black], value };
}
function dc(node: string, value: number): Reading {
  return { take: 'dc-volts', at: [node, MINUS], value };
}
function ohms(part: string, value: number | 'OL'): Reading {
  return { take: 'ohms', part, value };
}

/** Open cases; their readings lead somewhere. Values follow from the circuits in netlists/. */
export const OPEN_CASES: DemoCase[] = [
  {
    family: 'console-television-450',
    set: 'Holm Valley console, oak cabinet',
    complaint: 'Dead. No glow in any tube, the panel lamp went out with a flash.',
    earlierWork: 'The customer changed the fuse once; it did not help.',
    state: 'on-the-bench',
    lineVolts: 118,
    daysAgo: 2,
    readings: [ac('L', 118), ac('E3', 117.8), ac('G5', 0)],
  },
  {
    family: 'portable-receiver-150',
    set: 'Larkfield portable, green case',
    complaint: 'No sound and no light since the set was dropped.',
    state: 'on-the-bench',
    lineVolts: 116,
    daysAgo: 1,
    readings: [ac('L', 116), ac('D4', 116.2), ac('D6', 0)],
  },
  {
    family: 'table-receiver-half-wave',
    set: 'Larkfield table receiver, ivory',
    complaint: 'Weak and distorted, loud hum after half an hour.',
    state: 'waiting-for-parts',
    lineVolts: 117,
    daysAgo: 6,
    readings: [ac('L', 117, MINUS), dc('B1', 104), dc('B2', 55)],
  },
  {
    family: 'television-doubler',
    set: 'Holm Valley tabletop television',
    complaint: 'Small, dim picture that shrinks from the sides.',
    state: 'waiting',
    lineVolts: 119,
    daysAgo: 0,
    readings: [],
  },
];

function solved(
  family: string,
  set: string,
  complaint: string,
  daysAgo: number,
  faults: DemoCase['faults'],
  note: string,
  readings: Reading[],
): DemoCase {
  return {
    family,
    set,
    complaint,
    daysAgo,
    faults,
    note,
    readings,
    state: 'closed',
    lineVolts: 117,
    outcome: faults!.length > 0 ? 'repaired' : 'no-fault',
  };
}

/** Solved cases: what the shop has found on these families. */
export const SOLVED_CASES: DemoCase[] = [
  solved(
    'console-television-450',
    'Holm Valley console, walnut',
    'Dead set.',
    210,
    [
      { part: 'R1B', mode: 'open' },
      { part: 'DS1', mode: 'open' },
    ],
    'Middle section of the dropper open, the lamp across it burnt. Fitted a new three-section dropper and lamp.',
    [ohms('R1B', 'OL'), ohms('DS1', 'OL'), ohms('R1A', 33.4)],
  ),
  solved(
    'console-television-450',
    'Holm Valley console, blond',
    'Dead after a thunderstorm.',
    180,
    [
      { part: 'F1', mode: 'open' },
      { part: 'R1A', mode: 'open' },
      { part: 'R1B', mode: 'open' },
    ],
    'A surge took the fuse and two sections of the dropper.',
    [ohms('F1', 'OL'), ohms('R1A', 'OL'), ohms('R1B', 'OL'), ohms('R1C', 18.3)],
  ),
  solved(
    'console-television-450',
    'Holm Valley console, walnut',
    'Panel lamp dark, picture normal.',
    150,
    [{ part: 'DS1', mode: 'open' }],
    'New panel lamp.',
    [ohms('DS1', 12.2), ohms('R1B', 12.2)],
  ),
  solved(
    'console-television-450',
    'Holm Valley lowboy',
    'No picture, tubes cold.',
    122,
    [{ part: 'RT1', mode: 'open' }],
    'Thermistor cracked through.',
    [ohms('RT1', 'OL'), ohms('F1', 0.2)],
  ),
  solved(
    'console-television-450',
    'Holm Valley lowboy',
    'Comes and goes with a knock on the cabinet.',
    96,
    [{ part: 'S1', mode: 'poor-contact' }],
    'Switch contacts burnt; switch replaced.',
    [ohms('S1', 85)],
  ),
  solved(
    'portable-receiver-150',
    'Larkfield portable, red',
    'Dead.',
    140,
    [{ part: 'V6A', mode: 'open' }],
    'Rectifier heater open.',
    [ohms('V6A', 'OL'), ohms('V5', 39)],
  ),
  solved(
    'portable-receiver-150',
    'Larkfield portable, brown',
    'Dead.',
    88,
    [{ part: 'V5', mode: 'open' }],
    'Output tube heater open.',
    [ohms('V5', 'OL'), ohms('V6A', 31)],
  ),
  solved(
    'portable-receiver-150',
    'Larkfield portable, green',
    'The owner wants it looked over before a trip.',
    61,
    [],
    'Nothing wrong: all heaters within five per cent.',
    [ohms('V5', 38.5), ohms('V3', 14.2)],
  ),
  solved(
    'table-receiver-half-wave',
    'Larkfield table receiver, walnut',
    'Hum.',
    74,
    [
      { part: 'C1A', mode: 'low' },
      { part: 'C1B', mode: 'low' },
    ],
    'Can dried out; both sections replaced.',
    [ohms('R13', 1230)],
  ),
  solved(
    'television-doubler',
    'Holm Valley tabletop television',
    'Small picture.',
    45,
    [{ part: 'SR2', mode: 'weak' }],
    'Weak selenium; replaced by silicon with series resistance.',
    [ohms('L40', 44)],
  ),
];
