/** Limits of one entry of readings. */
export const READINGS_MOST = 500;
export const NOTE_MOST = 300;
export const CLIENT_ID_MOST = 64;
