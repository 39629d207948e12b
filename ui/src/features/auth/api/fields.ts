import * as z from 'zod/mini';

/** An e-mail address. */
export const emailField = z
  .string()
  .check(
    z.trim(),
    z.regex(/^[^\s@]+@[^\s@]+$/, 'Type an e-mail address, such as kim@shop.example.'),
  );

/** A password that is being chosen. */
export const newPasswordField = z
  .string()
  .check(
    z.minLength(10, 'A password needs at least 10 characters. A few words make a good one.'),
    z.maxLength(72, 'Choose at most 72 characters.'),
  );
