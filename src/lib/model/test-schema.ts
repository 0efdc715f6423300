import { testIds } from '$lib/stats/test-ids';
import { z } from 'zod';

/* A test of a diagnosis document, of all shots or of those with at least one defect. */
const share = z.number().min(0).max(1);

export const testIdSchema = z.enum(testIds);

export const testSchema = z.strictObject({
  id: testIdSchema,
  statistic: z.number(),
  p: share,
  pAdjusted: share,
  smallestP: share,
  source: z.enum(['exact', 'resampled', 'permuted', 'limit']),
  resamples: z.int().nonnegative(),
  stoppedEarly: z.boolean()
});
