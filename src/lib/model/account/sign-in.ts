import { z } from 'zod';

/** An address as people type it; 254 characters are the longest that mail can be sent to (RFC 5321, erratum 1690). */
export const emailField = z
  .string()
  .trim()
  .min(1, 'Type your address.')
  .max(254, 'An address has at most 254 characters.')
  .pipe(z.email('This is not an address, such as ada@example.org.'));

export const signInForm = z.object({
  email: emailField,
  // No rule on what a password is like: one that was taken once must always do to sign in.
  password: z.string().min(1, 'Type your password.').max(1000, 'A password has at most 1000 characters.')
});
