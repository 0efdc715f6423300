import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { link } from '../../db/schema';
import type { Actor } from '../access/actor';
import { recordEvent } from '../events/record-event';
import { linkableReport } from './linkable-report';

export type RevokedLink = { ok: true } | { ok: false; reason: 'unknown' | 'not-allowed' };

/** Closes a link for good; one that was closed before stays closed since then. */
export function revokeLink(
  db: Database,
  actor: Actor,
  reportId: string,
  linkId: string,
  now = Date.now()
): RevokedLink {
  return db.transaction(
    (tx): RevokedLink => {
      const found = linkableReport(tx, actor, reportId);
      if (!found.ok) return found;
      const mine = and(eq(link.id, linkId), eq(link.reportId, reportId), eq(link.teamId, actor.teamId));
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
            thing: reportId
          },
          now
        );
      }
      return { ok: true };
    },
    { behavior: 'immediate' }
  );
}
