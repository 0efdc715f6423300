import { z } from 'zod';
import { conditionsSchema } from './conditions';

/** Datasets that one bulk edit may change. */
export const MOST_IN_BULK = 1000;

/** Conditions to set alike on many datasets: only those named; null clears one. Names stay each its own. */
export const bulkEditSchema = z.strictObject({
  datasets: z.array(z.string().min(1).max(64)).min(1, 'Choose at least one dataset.').max(MOST_IN_BULK),
  set: conditionsSchema
    .omit({ name: true })
    .partial()
    .refine((set) => Object.keys(set).length > 0, 'Choose at least one condition to change.')
});

export type BulkEdit = z.infer<typeof bulkEditSchema>;
