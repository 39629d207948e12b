// In memory only: a script that reads storage finds no token, and closing the page forgets it.
let token: string | null = null;
let hasEnded = false;
let askAgain: () => Promise<boolean> = () => Promise.resolve(false);

/** The access token of the person who is signed in, or null. */
export function accessToken(): string | null {
  return token;
}

/** Keeps the access token until the page is left; null forgets it. */
export function keepAccessToken(next: string | null): void {
  token = next;
  hasEnded = false;
}

/** True from the moment a session ended by itself until somebody signs in or leaves. */
export function hasSessionEnded(): boolean {
  return hasEnded;
}

/** Registers who asks the person to sign in again; it answers whether they did. Replaces the former one. */
export function onSessionEnd(ask: () => Promise<boolean>): void {
  askAgain = ask;
}

/**
 * Forgets the token and asks the person to sign in again.
 *
 * @returns true when the same person is back, so that what waited may go on.
 */
export function endSession(): Promise<boolean> {
  token = null;
  hasEnded = true;
  return askAgain();
}
