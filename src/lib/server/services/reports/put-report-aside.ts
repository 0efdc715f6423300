import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { report } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';

/** Takes a report out of every list, and closes its links; it can be brought back for 30 days. Experimenters only their own. */
export function putReportAside(
  db: Database,
  actor: Actor,
  id: string,
  now = Date.now()
): { ok: true; number: number } | { ok: false; reason: 'unknown' } {
  return db.transaction(
    (tx) => {
      const done = tx
        .update(report)
        .set({ deletedAt: now, deletedBy: actor.personId })
        .where(
          and(
            eq(report.id, id),
            isNull(report.deletedAt),
            mayWhere(actor, 'delete', report.teamId, report.createdBy)
          )
        )
        .returning({ number: report.number, dataset: report.datasetId })
        .get() as { number: number; dataset: string } | undefined;
      if (!done) return { ok: false, reason: 'unknown' } as const;
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: id };
      recordEvent(tx, { ...happening, action: 'report.aside', detail: done }, now);
      return { ok: true, number: done.number } as const;
    },
    { behavior: 'immediate' }
  );
}
