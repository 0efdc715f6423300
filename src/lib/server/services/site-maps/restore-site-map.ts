import { and, eq, isNotNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { siteMap } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';

/** Brings a map of sites back that was put aside. Experimenters only their own. */
export function restoreSiteMap(
  db: Database,
  actor: Actor,
  id: string,
  now = Date.now()
): { ok: true; name: string } | { ok: false; reason: 'unknown' } {
  return db.transaction(
    (tx) => {
      const may = mayWhere(actor, 'restore', siteMap.teamId, siteMap.createdBy);
      const done = tx
        .update(siteMap)
        .set({ deletedAt: null, deletedBy: null })
        .where(and(eq(siteMap.id, id), isNotNull(siteMap.deletedAt), may))
        .returning({ name: siteMap.name })
        .get() as { name: string } | undefined;
      if (!done) return { ok: false, reason: 'unknown' } as const;
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: id };
      recordEvent(tx, { ...happening, action: 'site-map.restore', detail: done }, now);
      return { ok: true, name: done.name } as const;
    },
    { behavior: 'immediate' }
  );
}
