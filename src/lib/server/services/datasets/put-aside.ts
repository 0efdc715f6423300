import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';

/** Takes a dataset out of every list; it can be brought back for 30 days. Experimenters only their own. */
export function putAside(
  db: Database,
  actor: Actor,
  id: string,
  now = Date.now()
): { ok: true; name: string } | { ok: false; reason: 'unknown' } {
  return db.transaction(
    (tx) => {
      const done = tx
        .update(dataset)
        .set({ deletedAt: now, deletedBy: actor.personId })
        .where(
          and(
            eq(dataset.id, id),
            isNull(dataset.deletedAt),
            mayWhere(actor, 'delete', dataset.teamId, dataset.createdBy)
          )
        )
        .returning({ name: dataset.name })
        .get() as { name: string } | undefined;
      if (!done) return { ok: false, reason: 'unknown' } as const;
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: id };
      recordEvent(tx, { ...happening, action: 'dataset.aside', detail: { name: done.name } }, now);
      return { ok: true, name: done.name } as const;
    },
    { behavior: 'immediate' }
  );
}
