import { z } from 'zod';

/** An e-mail address. */
export const emailField = z
  .string()
  .trim()
  .regex(/^[^\s@]+@[^\s@]+$/, 'Type an e-mail address, such as kim@shop.example.');

/** A password that is being chosen. */
export const newPasswordField = z
  .string()
  .min(10, 'A password needs at least 10 characters. A few words make a good one.')
  .max(72, 'Choose at most 72 characters.');
