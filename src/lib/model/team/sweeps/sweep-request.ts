import { MOST_SWEPT } from '$lib/stats/sweep/read-sweep';
import { z } from 'zod';

const positive = z.number().positive().finite();

/** What makes a sweep: its datasets, and how it is to be looked at. */
export const sweepRequestSchema = z.object({
  /** Made from axis and times when left out. */
  name: z.string().trim().min(1).max(200).optional(),
  notes: z.string().trim().max(2000).optional(),
  /** Ids, each once; the order does not matter. */
  datasets: z.array(z.string().min(1).max(100)).min(1).max(MOST_SWEPT),
  axis: z.enum(['quench-time', 'hold-time']),
  /** Times that the power laws are fitted between, both included, in the unit of the first dataset; null for all. */
  window: z.object({ from: positive, to: positive }).nullable().default(null),
  /** d, ν and z of a transition to compare with. */
  transition: z
    .object({ dimension: positive, correlation: positive, dynamic: positive })
    .nullable()
    .default(null),
  alpha: z.number().gt(0).lt(0.5).default(0.05)
});

export type SweepRequest = z.infer<typeof sweepRequestSchema>;
