import { type Actor, isAtLeast } from '../common/policy';

/** Everybody who is signed in reads families. */
export function canReadFamilies(actor: Actor): boolean {
  return isAtLeast(actor, 'trainee');
}

/** Senior technicians keep the library. */
export function canWriteFamilies(actor: Actor): boolean {
  return isAtLeast(actor, 'senior');
}
