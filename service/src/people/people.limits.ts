/** Limits of what is typed about people; forms, DTOs and models share them. */
export const NAME_MOST = 120;
export const EMAIL_MOST = 254;
/** NIST SP 800-63B asks for length and no forced mix. */
export const PASSWORD_LEAST = 10;
/** bcrypt reads 72 bytes; longer ones would be cut silently. */
export const PASSWORD_MOST = 72;
/** An invitation can be accepted for this many days. */
export const INVITATION_DAYS = 7;
