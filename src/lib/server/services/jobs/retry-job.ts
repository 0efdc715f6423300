import { and, eq } from 'drizzle-orm';
import type { DiagnoseOptions } from '../../../stats/types';
import type { Database } from '../../db/client';
import { job } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { enqueueJobs, type Enqueued } from './enqueue-jobs';

/**
 * Asks again for a diagnosis that failed or was cancelled: a new job, as hard as the old one, with the dataset's
 * conditions as they are now (a wrong number of trials is the usual reason, and is mended there).
 */
export function retryJob(
  db: Database,
  actor: Actor,
  id: string,
  now = Date.now()
): Enqueued | { ok: false; reason: 'not-failed' } {
  const found = db
    .select({ status: job.status, datasetId: job.datasetId, options: job.options })
    .from(job)
    .where(and(eq(job.id, id), mayWhere(actor, 'diagnose', job.teamId)))
    .get();
  if (!found) return { ok: false, reason: 'unknown' };
  if (found.status !== 'failed' && found.status !== 'cancelled') return { ok: false, reason: 'not-failed' };
  const { alpha, tolerance, resamples, seed } = JSON.parse(found.options) as DiagnoseOptions;
  return enqueueJobs(db, actor, [found.datasetId], { alpha, tolerance, resamples, seed }, now);
}
