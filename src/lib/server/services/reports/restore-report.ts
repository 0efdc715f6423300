import { and, eq, isNotNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, report } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';

/** Brings a report back that was put aside. Experimenters only their own. */
export function restoreReport(
  db: Database,
  actor: Actor,
  id: string,
  now = Date.now()
): { ok: true; number: number } | { ok: false; reason: 'unknown' | 'dataset-aside' } {
  return db.transaction(
    (tx) => {
      const where = and(
        eq(report.id, id),
        isNotNull(report.deletedAt),
        mayWhere(actor, 'restore', report.teamId, report.createdBy)
      );
      const found = tx
        .select({ number: report.number, dataset: report.datasetId, datasetAside: dataset.deletedAt })
        .from(report)
        .innerJoin(dataset, eq(dataset.id, report.datasetId))
        .where(where)
        .get();
      if (!found) return { ok: false, reason: 'unknown' } as const;
      // It would be back and still nowhere to be seen.
      if (found.datasetAside !== null) return { ok: false, reason: 'dataset-aside' } as const;
      tx.update(report).set({ deletedAt: null, deletedBy: null }).where(eq(report.id, id)).run();
      const { number, dataset: datasetId } = found;
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: id };
      recordEvent(
        tx,
        { ...happening, action: 'report.restore', detail: { number, dataset: datasetId } },
        now
      );
      return { ok: true, number } as const;
    },
    { behavior: 'immediate' }
  );
}
