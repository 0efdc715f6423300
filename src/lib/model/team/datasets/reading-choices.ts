import { z } from 'zod';

/** What a person may settle about how a file is read; the choices of formats, as they are sent and kept. */
export const readingChoicesSchema = z.strictObject({
  format: z.enum(['auto', 'counts', 'shots', 'positions', 'json']).optional(),
  encoding: z.enum(['utf-8', 'utf-16le', 'utf-16be', 'windows-1252']).optional(),
  separator: z.enum(['comma', 'semicolon', 'tab', 'spaces', 'none']).optional(),
  header: z.boolean().optional(),
  columns: z
    .array(
      z.strictObject({
        column: z.union([z.number().int().min(1), z.string()]),
        role: z.enum(['count', 'frequency', 'shot', 'batch', 'condition', 'ignored'])
      })
    )
    .max(1000)
    .optional(),
  decimal: z.enum(['.', ',']).optional(),
  thousands: z.enum(['.', ',', 'none']).optional()
});

export type ReadingChoices = z.infer<typeof readingChoicesSchema>;
