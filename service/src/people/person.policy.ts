import { type Actor, isAtLeast } from '../common/policy';

/** The owner sees who works in the shop. */
export function canListPeople(actor: Actor): boolean {
  return isAtLeast(actor, 'owner');
}

/** The owner invites. */
export function canInvite(actor: Actor): boolean {
  return isAtLeast(actor, 'owner');
}

/** The owner changes roles and blocks, but not their own: the shop would be without a key. */
export function canChange(actor: Actor, target: { id: number }): boolean {
  return isAtLeast(actor, 'owner') && actor.id !== target.id;
}
