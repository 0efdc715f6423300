import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { sweep } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';

/** Takes a sweep out of every list; it can be brought back for 30 days. Experimenters only their own. */
export function putSweepAside(
  db: Database,
  actor: Actor,
  id: string,
  now = Date.now()
): { ok: true; name: string } | { ok: false; reason: 'unknown' } {
  return db.transaction(
    (tx) => {
      const may = mayWhere(actor, 'delete', sweep.teamId, sweep.createdBy);
      const done = tx
        .update(sweep)
        .set({ deletedAt: now, deletedBy: actor.personId })
        .where(and(eq(sweep.id, id), isNull(sweep.deletedAt), may))
        .returning({ name: sweep.name })
        .get() as { name: string } | undefined;
      if (!done) return { ok: false, reason: 'unknown' } as const;
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: id };
      recordEvent(tx, { ...happening, action: 'sweep.aside', detail: done }, now);
      return { ok: true, name: done.name } as const;
    },
    { behavior: 'immediate' }
  );
}
