import { ProblemException } from './problem';

/** Roles from least to most. */
export const ROLES = ['trainee', 'technician', 'senior', 'owner'] as const;
export type Role = (typeof ROLES)[number];

/** Who acts, as far as policies care. */
export interface Actor {
  id: number;
  role: Role;
  isBlocked: boolean;
}

/** True when the actor's role is this one or a higher one. */
export function isAtLeast(actor: Actor, role: Role): boolean {
  return !actor.isBlocked && ROLES.indexOf(actor.role) >= ROLES.indexOf(role);
}

/**
 * Lets a policy's answer decide.
 *
 * @throws ProblemException 403 with the sentence when it is no.
 */
export function allow(isAllowed: boolean, sentence: string): void {
  if (!isAllowed) throw new ProblemException(403, 'not-allowed', sentence);
}
