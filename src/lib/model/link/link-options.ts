import { z } from 'zod';

/** Who may open a link. */
export const AUDIENCES = ['anyone', 'named', 'team'] as const;
/** What a link shows. */
export const SHOWS = ['report', 'report-and-counts'] as const;

export type Audience = (typeof AUDIENCES)[number];
export type Shows = (typeof SHOWS)[number];

/** People that one link may name: a programme committee, not a mailing list. */
export const MOST_PEOPLE = 50;

const address = z
  .string()
  .trim()
  .toLowerCase()
  .pipe(z.email({ error: 'is not an address that mail can be sent to' }));

/** What a person chooses when making a link; the same on the page and at the JSON route. */
export const linkOptionsSchema = z
  .strictObject({
    label: z
      .string()
      .trim()
      .min(1, { error: 'Give the link a name, so that you know it again.' })
      .max(120, { error: 'The name may have at most 120 letters.' }),
    audience: z.enum(AUDIENCES),
    people: z
      .array(address)
      .max(MOST_PEOPLE, { error: `A link may name at most ${MOST_PEOPLE} people.` })
      .default([])
      .transform((list) => [...new Set(list)]),
    shows: z.enum(SHOWS),
    blind: z.boolean(),
    hidesReferees: z.boolean(),
    allowsRemarks: z.boolean(),
    /** Milliseconds since 1970; null for a link that stays open until it is revoked. */
    expiresAt: z.int().positive().nullable().default(null),
    visitLimit: z
      .int({ error: 'The number of visits must be a whole number.' })
      .min(1, { error: 'At least one visit must be allowed.' })
      .max(100_000, { error: 'Leave the limit out when so many visits are allowed.' })
      .nullable()
      .default(null)
  })
  .refine((link) => link.audience !== 'named' || link.people.length > 0, {
    path: ['people'],
    error: 'Name at least one address, one a line.'
  });

export type LinkOptions = z.infer<typeof linkOptionsSchema>;
