import { z } from 'zod';

/** An address as people type it; 254 characters are the longest that mail can be sent to (RFC 5321, erratum 1690). */
export const emailField = z
  .string()
  .trim()
  .min(1, 'Type your address.')
  .max(254, 'An address has at most 254 characters.')
  .pipe(z.email('This is not an address, such as ada@example.org.'));

// No rule on what a password is like: one that was taken once must always do to sign in.
const password = z
  .string()
  .min(1, 'Type your password.')
  .max(1000, 'No password here has more than 1000 characters.');

export const signInForm = z.object({ email: emailField, password });

/** For a link by mail. */
export const emailForm = z.object({ email: emailField });

/** Its strength is judged by judgePassword. */
export const newPasswordForm = z.object({ password });

export const changePasswordForm = z.object({ old: password, password });

export const nameForm = z.object({
  name: z
    .string()
    .trim()
    .min(1, 'Type a name.')
    .max(80, 'A name has at most 80 characters.')
    .regex(/^[^\p{Cc}]*$/u, 'A name is one line of text.')
});
