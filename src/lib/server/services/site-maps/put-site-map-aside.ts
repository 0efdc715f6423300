import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { siteMap } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';

/** Takes a map of sites out of every list; it can be brought back for 30 days. Experimenters only their own. */
export function putSiteMapAside(
  db: Database,
  actor: Actor,
  id: string,
  now = Date.now()
): { ok: true; name: string } | { ok: false; reason: 'unknown' } {
  return db.transaction(
    (tx) => {
      const may = mayWhere(actor, 'delete', siteMap.teamId, siteMap.createdBy);
      const done = tx
        .update(siteMap)
        .set({ deletedAt: now, deletedBy: actor.personId })
        .where(and(eq(siteMap.id, id), isNull(siteMap.deletedAt), may))
        .returning({ name: siteMap.name })
        .get() as { name: string } | undefined;
      if (!done) return { ok: false, reason: 'unknown' } as const;
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: id };
      recordEvent(tx, { ...happening, action: 'site-map.aside', detail: done }, now);
      return { ok: true, name: done.name } as const;
    },
    { behavior: 'immediate' }
  );
}
