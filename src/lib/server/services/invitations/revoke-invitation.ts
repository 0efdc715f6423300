import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { invitation } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';

export type RevokeInvitation = { ok: true; email: string } | { ok: false; reason: 'unknown' | 'accepted' };

/** Ends an invitation: its address opens nothing any more. Revoking twice is the same as once. */
export function revokeInvitation(db: Database, actor: Actor, id: string, now = Date.now()): RevokeInvitation {
  return db.transaction(
    (tx): RevokeInvitation => {
      const it = and(eq(invitation.id, id), mayWhere(actor, 'manage', invitation.teamId));
      const before = tx
        .select({ email: invitation.email, acceptedAt: invitation.acceptedAt })
        .from(invitation)
        .where(it)
        .get();
      if (!before) return { ok: false, reason: 'unknown' };
      if (before.acceptedAt !== null) return { ok: false, reason: 'accepted' };
      const { email } = before;
      const { changes } = tx
        .update(invitation)
        .set({ revokedAt: now })
        .where(and(it, isNull(invitation.revokedAt)))
        .run();
      if (changes === 1)
        recordEvent(
          tx,
          {
            action: 'invitation.revoke',
            teamId: actor.teamId,
            personId: actor.personId,
            thing: id,
            detail: { email }
          },
          now
        );
      return { ok: true, email };
    },
    { behavior: 'immediate' }
  );
}
