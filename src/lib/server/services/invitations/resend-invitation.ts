import { and, eq, isNull } from 'drizzle-orm';
import { newToken } from '../../auth/new-token';
import type { Database } from '../../db/client';
import { invitation } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';
import { BETWEEN_MAILS, INVITATION_LIFE } from './life';
import { mailInvitation, type Mailed } from './mail-invitation';

export type ResendInvitation =
  | ({ ok: true; email: string } & Mailed)
  /** `unknown`: none of that id, or it was accepted or revoked; `too-soon`: the last mail went less than a minute ago. */
  | { ok: false; reason: 'unknown' | 'too-soon' };

/** Sends an invitation again, for another 14 days and with a new token: the address of the earlier mail ends. */
export async function resendInvitation(
  db: Database,
  actor: Actor,
  id: string,
  addressOf: (token: string) => string,
  now = Date.now()
): Promise<ResendInvitation> {
  const { token, hash } = newToken();
  const expiresAt = now + INVITATION_LIFE;
  const found = db.transaction(
    (tx) => {
      const it = and(
        eq(invitation.id, id),
        mayWhere(actor, 'manage', invitation.teamId),
        isNull(invitation.acceptedAt),
        isNull(invitation.revokedAt)
      );
      const before = tx
        .select({ email: invitation.email, role: invitation.role, expiresAt: invitation.expiresAt })
        .from(invitation)
        .where(it)
        .get();
      if (!before) return 'unknown';
      // It was last sent a life before it ends.
      if (now - (before.expiresAt - INVITATION_LIFE) < BETWEEN_MAILS) return 'too-soon';
      tx.update(invitation).set({ tokenHash: hash, expiresAt }).where(it).run();
      recordEvent(
        tx,
        {
          action: 'invitation.resend',
          teamId: actor.teamId,
          personId: actor.personId,
          thing: id,
          detail: { email: before.email, role: before.role }
        },
        now
      );
      return before;
    },
    { behavior: 'immediate' }
  );
  if (typeof found === 'string') return { ok: false, reason: found };
  const { email, role } = found;
  const mailed = await mailInvitation(db, actor, { email, role, address: addressOf(token), expiresAt });
  return { ok: true, email, ...mailed };
}
