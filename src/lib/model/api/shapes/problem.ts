import { z } from 'zod';

/** One thing that is wrong with what was sent, and where. */
export const faultSchema = z.object({
  at: z.string().optional().describe('Name of the field or parameter, with dots for what lies within'),
  line: z.int().nullable().optional().describe('Line of the body, from 1'),
  column: z.int().nullable().optional().describe('Column of that line, from 1'),
  message: z.string().describe('What is wrong, in one sentence'),
  fix: z.string().optional().describe('What to do about it')
});

/** Problem details of RFC 9457. */
export const problemSchema = z.object({
  type: z.literal('about:blank'),
  status: z.int().describe('The status of the answer, once more'),
  code: z.string().describe('Short name for scripts, which stays the same when words change'),
  title: z.string().describe('One sentence for people'),
  detail: z.string().optional(),
  errors: z.array(faultSchema).optional().describe('At most 20, each at its place'),
  more: z.int().optional().describe('How many there are beyond those listed'),
  already: z
    .array(z.object({ id: z.string(), name: z.string() }))
    .optional()
    .describe('Datasets that hold the same counts from the same bytes'),
  requestId: z
    .string()
    .optional()
    .describe('The X-Request-Id of this answer: finds the request in the log of the server'),
  errorId: z.string().optional().describe('The same, where something went wrong on our side')
});
