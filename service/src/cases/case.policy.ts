import { type Actor, isAtLeast } from '../common/policy';
import type { CaseState } from './case.model';

/** What a policy needs to know of a case. */
export interface CaseTarget {
  state: CaseState;
}

/** Everybody in the shop sees its cases. */
export function canReadCases(actor: Actor): boolean {
  return isAtLeast(actor, 'trainee');
}

/** Everybody opens cases. */
export function canOpenCase(actor: Actor): boolean {
  return isAtLeast(actor, 'trainee');
}

/** Everybody works on an open case. */
export function canEditCase(actor: Actor, target: CaseTarget): boolean {
  return isAtLeast(actor, 'trainee') && target.state !== 'closed';
}

/** Readings go into open cases only. */
export function canRecord(actor: Actor, target: CaseTarget): boolean {
  return canEditCase(actor, target);
}

/** A trainee's case is closed by somebody who has done it before. */
export function canCloseCase(actor: Actor, target: CaseTarget): boolean {
  return isAtLeast(actor, 'technician') && target.state !== 'closed';
}

/** Reopening takes a case back from the shelf. */
export function canReopenCase(actor: Actor, target: CaseTarget): boolean {
  return isAtLeast(actor, 'technician') && target.state === 'closed';
}
