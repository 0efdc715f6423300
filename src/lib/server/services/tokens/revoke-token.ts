import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { apiToken } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';

export type RevokedToken = { ok: true; name: string } | { ok: false; reason: 'unknown' };

/** Ends a token for good: by who made it, or by a lead. One that was revoked before stays so since then. */
export function revokeToken(db: Database, actor: Actor, id: string, now = Date.now()): RevokedToken {
  return db.transaction(
    (tx): RevokedToken => {
      const mine = and(eq(apiToken.id, id), mayWhere(actor, 'script', apiToken.teamId, apiToken.createdBy));
      const found = tx.select({ name: apiToken.name }).from(apiToken).where(mine).get();
      if (!found) return { ok: false, reason: 'unknown' };
      const { changes } = tx
        .update(apiToken)
        .set({ revokedAt: now })
        .where(and(mine, isNull(apiToken.revokedAt)))
        .run();
      if (changes > 0)
        recordEvent(
          tx,
          {
            action: 'token.revoke',
            teamId: actor.teamId,
            personId: actor.personId,
            thing: id,
            detail: { name: found.name }
          },
          now
        );
      return { ok: true, name: found.name };
    },
    { behavior: 'immediate' }
  );
}
