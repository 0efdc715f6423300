import { and, eq, inArray } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { job } from '../../db/schema';
import { abortJob } from '../../jobs/current-runner';
import { tellJobChange } from '../../jobs/job-changes';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';

/**
 * Cancels a job that waits or runs. Its row ends here and now; whatever thread runs it, in this process or another,
 * is ended within a second, and cannot save a report any more.
 */
export function cancelJob(
  db: Database,
  actor: Actor,
  id: string,
  now = Date.now()
): { ok: true } | { ok: false; reason: 'unknown' | 'ended' } {
  const result = db.transaction(
    (tx) => {
      const own = and(eq(job.id, id), mayWhere(actor, 'diagnose', job.teamId));
      const found = tx.select({ datasetId: job.datasetId }).from(job).where(own).get();
      if (!found) return { ok: false, reason: 'unknown' } as const;
      const { changes } = tx
        .update(job)
        .set({ status: 'cancelled', step: null, endedAt: now })
        .where(and(own, inArray(job.status, ['queued', 'running'])))
        .run();
      if (changes === 0) return { ok: false, reason: 'ended' } as const;
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: id };
      recordEvent(tx, { ...happening, action: 'job.cancel', detail: { dataset: found.datasetId } }, now);
      return { ok: true } as const;
    },
    { behavior: 'immediate' }
  );
  if (result.ok) {
    abortJob(id);
    tellJobChange(actor.teamId, id);
  }
  return result;
}
