/** Limits of what is typed about families. */
export const FAMILY_NAME_MOST = 120;
export const NOTE_MOST = 300;
export const TAGS_MOST = 12;
export const TAG_MOST = 40;
