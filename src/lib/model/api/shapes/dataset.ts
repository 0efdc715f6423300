import { z } from 'zod';
import { frozenConditionsSchema } from '../../team/frozen-conditions';
import { verdictSchema } from './verdict';
import { momentSchema } from './moment';

const id = z.string();
const brief = {
  id,
  name: z.string(),
  kind: z.enum(['histogram', 'shots']),
  digest: z.string().describe('sha256 of the canonical histogram, as in a diagnosis document'),
  shots: z.int(),
  mean: z.number().describe('Sample mean; a lump counts as the count of it nearest to the others'),
  largest: z.int().describe('Largest count seen, or where a lump begins'),
  device: z.string().nullable(),
  firmware: z.string().nullable(),
  group: z
    .string()
    .nullable()
    .describe('Part of the device that was counted; null is all of it, or not stated'),
  trials: z.int().nullable().describe('Largest possible count; null when unknown'),
  createdAt: momentSchema
};

/** A dataset in a list. */
export const datasetEntrySchema = z.object(brief);
export type ApiDatasetEntry = z.infer<typeof datasetEntrySchema>;

/** A dataset with its conditions, file, counts and reports. */
export const datasetSchema = z.object({
  ...brief,
  conditions: frozenConditionsSchema.describe('Conditions as they are now; null is not stated'),
  counts: z.array(z.tuple([z.int(), z.int()])).describe('[count, shots], ascending; a shot list is summed'),
  lump: z
    .object({ from: z.int(), shots: z.int() })
    .nullable()
    .describe('Shots with this count or more, where the file says no more'),
  below: z
    .object({ to: z.int(), shots: z.int() })
    .nullable()
    .describe('Shots with this count or fewer, where the file says no more'),
  batches: z.int().nullable().describe('Number of batches of a shot list that has them'),
  by: z.string().nullable().describe('Name of who saved it; null when they are gone'),
  file: z
    .object({ name: z.string(), size: z.int().describe('Bytes'), sha256: z.string() })
    .describe('What was uploaded, kept byte for byte'),
  reports: z
    .array(z.object({ id, number: z.int(), verdict: verdictSchema, createdAt: momentSchema }))
    .describe('Newest first')
});
export type ApiDataset = z.infer<typeof datasetSchema>;
