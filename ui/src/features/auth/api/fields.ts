import { z } from 'zod';

/** An e-mail address. */
export const emailField = z
  .string()
  .trim()
  .regex(/^[^\s@]+@[^\s@]+$/, 'Type an e-mail address, such as kim@shop.example.');

/** A password that is being chosen. */
export const newPasswordField = z
  .string()
  .min(12, 'Choose at least 12 characters; a short sentence is easy to remember.')
  .max(200, 'Choose at most 200 characters.');
