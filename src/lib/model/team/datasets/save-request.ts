import { z } from 'zod';
import { conditionsSchema } from './conditions';
import { readingChoicesSchema } from './reading-choices';

/** Datasets in one saving: what one file may hold. */
export const MOST_AT_ONCE = 1000;

/** Which datasets of which uploaded files to save, under which conditions. */
export const saveRequestSchema = z.strictObject({
  files: z
    .array(
      z.strictObject({
        fileId: z.string().min(1).max(64),
        choices: readingChoicesSchema.default({}),
        /** Save again what is there already from the same bytes; each then needs a name of its own. */
        again: z.boolean().default(false),
        datasets: z
          .array(z.strictObject({ index: z.number().int().min(0), conditions: conditionsSchema }))
          .min(1)
          .max(MOST_AT_ONCE)
      })
    )
    .min(1)
    .max(MOST_AT_ONCE)
});

export type SaveRequest = z.infer<typeof saveRequestSchema>;
