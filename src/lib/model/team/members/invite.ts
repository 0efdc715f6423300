import { z } from 'zod';
import { ROLES } from '../roles';

/** An address to invite, and as what. */
export const inviteSchema = z.object({
  email: z
    .string()
    .trim()
    .toLowerCase()
    .max(254, 'Addresses have at most 254 characters.')
    .pipe(z.email('Write one mail address, such as ada@example.org.')),
  role: z.enum(ROLES).default('experimenter')
});
