import { z } from 'zod';
import { ROLES } from '../../team/roles';
import { SCOPES } from '../scopes';
import { momentSchema } from './moment';

/** The team that a token opens, and what the token may do there. */
export const teamSchema = z.object({
  slug: z.string().describe('Name of the team in addresses'),
  name: z.string(),
  token: z.object({
    name: z.string(),
    role: z.enum(ROLES).describe('The narrower of the token’s own role and that of who made it'),
    scopes: z.array(z.enum(SCOPES)),
    expiresAt: momentSchema
  })
});
export type ApiTeam = z.infer<typeof teamSchema>;
