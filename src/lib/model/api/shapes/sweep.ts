import { z } from 'zod';
import { sweepRequestSchema } from '../../team/sweeps/sweep-request';
import { momentSchema } from './moment';

const axis = z.enum(['quench-time', 'hold-time']);
const datasets = sweepRequestSchema.shape.datasets.describe(
  'Ids of the datasets, two or more with different times; the order does not matter'
);

/** What a script sends to make a sweep. A field that nobody knows is told, not passed over. */
export const newSweepSchema = z.strictObject({ ...sweepRequestSchema.shape, datasets });

/** A sweep as a list tells of it. */
export const sweepEntrySchema = z.object({
  id: z.string(),
  name: z.string(),
  axis,
  datasets: z.int().describe('How many it was made of'),
  statement: z.string().describe('The answer in one sentence'),
  by: z.string().nullable(),
  createdAt: momentSchema
});

/** One sweep, with what it was made of and how. */
export const sweepSchema = sweepEntrySchema.extend({
  statement: z.string().nullable().describe('The answer in one sentence; null when the document is damaged'),
  notes: z.string().nullable(),
  swept: z
    .array(
      z.object({
        id: z.string(),
        name: z.string(),
        digest: z.string(),
        device: z.string().nullable(),
        firmware: z.string().nullable(),
        group: z.string().nullable()
      })
    )
    .describe('Its datasets as they were when it was made'),
  timeUnit: z.string(),
  unit: z.enum(['defect', 'pair']),
  window: z
    .object({ from: z.number(), to: z.number() })
    .nullable()
    .describe('Times that the power laws were fitted between; null for all'),
  transition: z.object({ dimension: z.number(), correlation: z.number(), dynamic: z.number() }).nullable(),
  alpha: z.number(),
  engineVersion: z.string(),
  sha256: z.string().describe('Of document.json')
});
