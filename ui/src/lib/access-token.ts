// In memory only: a script that reads storage finds no token, and closing the page forgets it.
let token: string | null = null;
let handleSignedOut: () => void = () => {};

/** The access token of the person who is signed in, or null. */
export function accessToken(): string | null {
  return token;
}

/** Keeps the access token until the page is left; null forgets it. */
export function keepAccessToken(next: string | null): void {
  token = next;
}

/** Registers what happens once a session has ended for good; replaces the former handler. */
export function onSignedOut(handler: () => void): void {
  handleSignedOut = handler;
}

/** Forgets the token and tells the registered handler. */
export function endSession(): void {
  token = null;
  handleSignedOut();
}
