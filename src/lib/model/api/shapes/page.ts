import { z } from 'zod';

/** What every list takes. */
export const pageQuery = {
  limit: z.coerce.number().int().min(1).max(200).default(50).describe('Entries of one page, 1 to 200'),
  after: z
    .string()
    .max(200)
    .optional()
    .describe('The “next” of the page before; leave it out for the first page')
};

/** One page of a list, newest first. What is added meanwhile moves nothing. */
export const pageOf = <Entry extends z.ZodType>(entry: Entry) =>
  z.object({
    data: z.array(entry),
    next: z.string().nullable().describe('For “after” of the next page; null on the last')
  });
