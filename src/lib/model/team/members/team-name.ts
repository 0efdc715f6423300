import { z } from 'zod';

/** What a team is called; any letters, on one line. */
export const teamName = z
  .string()
  .trim()
  .min(1, 'Give the team a name.')
  .max(80, 'Write at most 80 characters.')
  .regex(/^[^\p{Cc}\u2028\u2029]*$/u, 'Write the name on one line.');

export const renameSchema = z.object({ name: teamName });
