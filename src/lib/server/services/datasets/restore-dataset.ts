import { and, eq, isNotNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';

/** Brings a dataset back that was put aside. Experimenters only their own. */
export function restoreDataset(
  db: Database,
  actor: Actor,
  id: string,
  now = Date.now()
): { ok: true; name: string } | { ok: false; reason: 'unknown' } {
  return db.transaction(
    (tx) => {
      const done = tx
        .update(dataset)
        .set({ deletedAt: null, deletedBy: null })
        .where(
          and(
            eq(dataset.id, id),
            isNotNull(dataset.deletedAt),
            mayWhere(actor, 'restore', dataset.teamId, dataset.createdBy)
          )
        )
        .returning({ name: dataset.name })
        .get() as { name: string } | undefined;
      if (!done) return { ok: false, reason: 'unknown' } as const;
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: id };
      recordEvent(tx, { ...happening, action: 'dataset.restore', detail: { name: done.name } }, now);
      return { ok: true, name: done.name } as const;
    },
    { behavior: 'immediate' }
  );
}
