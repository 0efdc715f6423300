import { z } from 'zod';
import { JOB_STATUSES } from '../../team/jobs/job-row';
import { momentSchema } from './moment';

/** A diagnosis that was asked for. */
export const jobSchema = z.object({
  id: z.string(),
  status: z.enum(JOB_STATUSES),
  dataset: z.object({ id: z.string(), name: z.string() }),
  share: z.number().min(0).max(1).describe('Share done'),
  step: z.string().nullable().describe('What is computed just now'),
  reason: z.string().nullable().describe('Why it failed'),
  report: z
    .object({ id: z.string(), number: z.int() })
    .nullable()
    .describe('What it made; null before, and when that was put aside'),
  by: z.string().nullable(),
  createdAt: momentSchema,
  endedAt: momentSchema.nullable()
});
export type ApiJob = z.infer<typeof jobSchema>;
