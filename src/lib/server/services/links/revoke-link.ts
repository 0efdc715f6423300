import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { link } from '../../db/schema';
import type { Actor } from '../access/actor';
import { recordEvent } from '../events/record-event';
import { linkable, linksOf, type Opens } from './linkable';

export type RevokedLink = { ok: true } | { ok: false; reason: 'unknown' | 'not-allowed' };

/** Closes a link for good; one that was closed before stays closed since then. */
export function revokeLink(
  db: Database,
  actor: Actor,
  opens: Opens,
  linkId: string,
  now = Date.now()
): RevokedLink {
  return db.transaction(
    (tx): RevokedLink => {
      const found = linkable(tx, actor, opens);
      if (!found.ok) return found;
      const mine = and(eq(link.id, linkId), linksOf(opens), eq(link.teamId, actor.teamId));
      if (!tx.select({ id: link.id }).from(link).where(mine).get()) return { ok: false, reason: 'unknown' };
      const closed = tx
        .update(link)
        .set({ revokedAt: now })
        .where(and(mine, isNull(link.revokedAt)))
        .run();
      if (closed.changes > 0) {
        recordEvent(
          tx,
          {
            action: 'link.revoke',
            teamId: actor.teamId,
            personId: actor.personId,
            linkId,
            thing: 'sweep' in opens ? opens.sweep : opens.report
          },
          now
        );
      }
      return { ok: true };
    },
    { behavior: 'immediate' }
  );
}
