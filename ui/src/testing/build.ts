import { type Case, type CaseSummary, type Person, type SignedIn } from '@/lib/api-model';
import { type Netlist } from '@engine/netlist/types';

/** A technician, unless told otherwise. */
export function buildPerson(overrides: Partial<Person> = {}): Person {
  return {
    id: 2,
    name: 'Tove Lindqvist',
    email: 'tove@shop.example',
    role: 'technician',
    isBlocked: false,
    isInvited: false,
    abilities: { managePeople: false, writeFamilies: false, closeCases: true, change: false },
    ...overrides,
  };
}

/** What the service answers when somebody comes in. */
export function buildSignedIn(person: Partial<Person> = {}): SignedIn {
  return { accessToken: 'token', expiresIn: 900, person: buildPerson(person) };
}

/** An open case as it stands in the list. */
export function buildCaseSummary(overrides: Partial<CaseSummary> = {}): CaseSummary {
  return {
    id: 7,
    number: '2026-0007',
    set: 'Console television, green cabinet',
    complaint: 'Dead. No tube lights.',
    state: 'on-the-bench',
    openedAt: '2026-03-04T09:00:00.000Z',
    changedAt: '2026-03-04T09:00:00.000Z',
    readings: 0,
    openedBy: { id: 2, name: 'Tove Lindqvist' },
    assignedTo: null,
    familyId: 1,
    familyName: 'Console television, 450 mA string',
    ...overrides,
  };
}

/** Two resistors across the line. */
export function buildNetlist(overrides: Partial<Netlist> = {}): Netlist {
  return {
    ohmstead: 1,
    title: 'Two resistors',
    reference: 'CHASSIS',
    line: { hot: 'L', return: 'CHASSIS', volts: 117, hertz: 60 },
    parts: [
      { ref: 'R1', kind: 'resistor', between: ['L', 'A'], ohms: 100 },
      { ref: 'R2', kind: 'resistor', between: ['A', 'CHASSIS'], ohms: 220 },
    ],
    points: [{ node: 'A', label: 'tap' }],
    ...overrides,
  };
}

/** An open case with everything a technician may do. */
export function buildCase(overrides: Partial<Case> = {}): Case {
  return {
    ...buildCaseSummary(),
    earlierWork: '',
    familyVersion: 1,
    netlist: buildNetlist(),
    asFound: [],
    lineVolts: null,
    cautionAcknowledged: false,
    confirmedFaults: [],
    outcome: null,
    closingNote: null,
    closedAt: null,
    version: 3,
    abilities: { edit: true, record: true, close: true, reopen: false },
    ...overrides,
  };
}
