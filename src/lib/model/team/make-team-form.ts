import { z } from 'zod';

export const teamName = z
  .string()
  .trim()
  .min(2, 'Give the team a name of two characters or more.')
  .max(80, 'A name has at most 80 characters.')
  .regex(/^[^\p{Cc}]*$/u, 'A name is one line of text.');

export const makeTeamForm = z.object({
  name: teamName,
  /** Empty: made from the name. */
  slug: z
    .string()
    .trim()
    .regex(
      /^([a-z0-9][a-z0-9-]{0,38}[a-z0-9])?$/,
      'Two to 40 lower case letters, digits and hyphens, with no hyphen at either end.'
    )
});
