/** Limits of what is typed about cases. */
export const SET_MOST = 160;
export const TEXT_MOST = 4000;
export const AS_FOUND_MOST = 40;
/** Line voltages of this world, with room for a variable transformer. */
export const LINE_VOLTS_LEAST = 20;
export const LINE_VOLTS_MOST = 300;
