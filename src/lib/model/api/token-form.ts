import { z } from 'zod';
import { ROLES } from '../team/roles';
import { SCOPE_WORDS, SCOPES, SCOPES_OF_ROLE } from './scopes';

/** Longest life of a token, days. */
export const LONGEST_LIFE = 365;

/** What a person says about a token they make. Whether the role is not above their own, the service says. */
export const tokenFormSchema = z
  .object({
    name: z
      .string()
      .trim()
      .min(1, 'Give the token a name: what the script is called, or where it runs.')
      .max(80, 'Write at most 80 characters.'),
    role: z.enum(ROLES).default('observer'),
    scopes: z.array(z.enum(SCOPES)).min(1, 'Choose at least one thing it may do.'),
    days: z
      .int('Write a whole number of days.')
      .min(1, 'A token lives at least one day.')
      .max(LONGEST_LIFE, `A token lives at most ${LONGEST_LIFE} days.`)
      .default(90)
  })
  .superRefine(({ role, scopes }, context) => {
    const useless = scopes.filter((scope) => !SCOPES_OF_ROLE[role].includes(scope));
    if (useless.length > 0)
      context.addIssue({
        code: 'custom',
        path: ['scopes'],
        message: `An ${role} may not ${useless.map((scope) => SCOPE_WORDS[scope]).join(' or ')}: choose another role, or leave it out.`
      });
  });

export type TokenForm = z.output<typeof tokenFormSchema>;
