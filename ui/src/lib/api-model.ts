import { type FaultMode, type AsFound, type Netlist } from '@engine/netlist/types';

/** Ids are numbers given by the service. */
export type Id = number;

/** What a person may do in the shop, from least to most. */
export const ROLES = ['trainee', 'technician', 'senior', 'owner'] as const;
export type Role = (typeof ROLES)[number];

/** What the service would let this person do; the screens hide the rest. */
export type Abilities = Record<string, boolean>;

export interface Person {
  id: Id;
  name: string;
  email: string;
  role: Role;
  isBlocked?: boolean;
  /** Invited and not yet accepted. */
  isInvited?: boolean;
  abilities?: Abilities;
}

export interface SignedIn {
  accessToken: string;
  /** Seconds until the access token runs out. */
  expiresIn: number;
  person: Person;
}

export interface PersonRef {
  id: Id;
  name: string;
}

export interface CaseSummary {
  id: Id;
  number: number | string;
  set: string;
  complaint: string;
  /** `open` and `closed`, and whatever else the shop has between. */
  state: string;
  openedAt: string;
  openedBy?: PersonRef | null;
  assignedTo?: PersonRef | null;
  familyId?: Id | null;
  familyName?: string | null;
}

export interface ConfirmedFault {
  part: string;
  mode: FaultMode;
}

export type Outcome = 'repaired' | 'no-fault' | 'not-repaired';

export interface Case extends CaseSummary {
  earlierWork?: string | null;
  familyVersion?: number | null;
  netlist: Netlist;
  asFound: AsFound[];
  lineVolts?: number | null;
  cautionAcknowledged: unknown;
  confirmedFaults: ConfirmedFault[];
  closedAt?: string | null;
  outcome?: Outcome | null;
  closingNote?: string | null;
  version: number;
  abilities: Abilities;
}

export interface FamilySummary {
  id: Id;
  name: string;
  kind: string;
  tags?: string[];
  description?: string | null;
  version?: number;
  /** How many parts the circuit has. */
  parts?: number;
  /** Tube types that the circuit names. */
  tubes?: string[];
  solvedCases?: number;
}

export interface Family extends FamilySummary {
  version: number;
  netlist: Netlist;
  versions: { version: number; by?: string | null; at: string; note?: string | null }[];
  solved?: {
    cases: number;
    faults: { part: string; mode: FaultMode; count: number }[];
  };
  abilities: Abilities;
}

export interface RuleSummary {
  /** The rule's own id, a word. */
  id: string;
  pack: string;
  name: string;
  sentence: string;
  effects: string[];
  because: string;
  source?: { title: string; status: string };
  version: number;
  state: string;
}

export interface RuleList {
  rules: RuleSummary[];
  refused: { file: string; reason: string }[];
}

export interface PartFact {
  type: string;
  volts: number;
  amps: number;
  source: string;
  /** "confirmed" for the fields it names, else "from memory". */
  status: string;
  /** What a tube does. */
  role?: string;
  base?: string;
  beadColour?: string;
  note?: string;
}

export interface Page<Item> {
  total: number;
  items: Item[];
}
