import { type FaultMode } from '@engine/netlist/types';
import { type StatusTone } from '@/components/StatusBadge';
import { type Outcome, type Role } from './api-model';

/** Roles as the shop says them. */
export const ROLE_WORDS: Record<Role, string> = {
  trainee: 'Trainee',
  technician: 'Technician',
  senior: 'Senior technician',
  owner: 'Owner',
};

/** What each role may do, for the person who hands roles out. */
export const ROLE_HINTS: Record<Role, string> = {
  trainee: 'Opens cases and enters readings. Cannot close a case.',
  technician: 'Everything on a case, closing it included.',
  senior: 'Also keeps families and rules.',
  owner: 'Also invites people and gives roles.',
};

/** How a case ended. */
export const OUTCOME_WORDS: Record<Outcome, string> = {
  repaired: 'Repaired',
  'no-fault': 'No fault was found',
  'not-repaired': 'Not repaired',
};

/** Fault modes as they follow a part's name: "R1B open". */
export const FAULT_WORDS: Record<FaultMode, string> = {
  open: 'open',
  high: 'gone high',
  low: 'gone low',
  bridged: 'bridged',
  shorted: 'shorted',
  'wrong-type': 'wrong type fitted',
  'heater-cathode-leak': 'heater to cathode leak',
  'poor-contact': 'poor contact',
  leaky: 'leaky',
  'high-esr': 'high series resistance',
  weak: 'weak',
  'shorted-turns': 'shorted turns',
  overload: 'draws too much',
  'no-load': 'draws nothing',
};

const STATES: Record<string, { word: string; tone: StatusTone }> = {
  waiting: { word: 'Waiting', tone: 'calm' },
  'on-the-bench': { word: 'On the bench', tone: 'busy' },
  'waiting-for-customer': { word: 'Waits for the customer', tone: 'warn' },
  'waiting-for-parts': { word: 'Waits for parts', tone: 'warn' },
  proof: { word: 'In proof', tone: 'busy' },
  closed: { word: 'Closed', tone: 'done' },
};

/** States that an open case can be given; closing is a step of its own. */
export const OPEN_STATES = Object.keys(STATES).filter((state) => state !== 'closed');

/**
 * Names a case's state.
 *
 * @param state word used by the service.
 * @returns the word shown and how it is toned.
 */
export function stateInWords(state: string): { word: string; tone: StatusTone } {
  return STATES[state] ?? { word: state.replaceAll('-', ' '), tone: 'calm' };
}

const DAY = new Intl.DateTimeFormat('en', { day: 'numeric', month: 'short', year: 'numeric' });

/** A day such as "Mar 4, 2025"; empty when there is none. */
export function dayInWords(iso: string | null | undefined): string {
  if (!iso) return '';
  const date = new Date(iso);
  return Number.isNaN(date.getTime()) ? '' : DAY.format(date);
}
