import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { invitation, membership } from '../../db/schema';
import { recordEvent } from '../events/record-event';
import { openWhere } from './open-where';
import { readInvitation, type Fit } from './read-invitation';

export type AcceptInvitation =
  | { ok: true; teamSlug: string }
  | { ok: false; reason: 'unknown' | 'revoked' | 'expired' | 'used' | Exclude<Fit, 'ready'> };

/**
 * Makes the person a member, once. The token came by mail and may have been passed on, so it is not enough: the
 * person's own address must be the invited one, and shown to be theirs.
 */
export function acceptInvitation(
  db: Database,
  personId: string,
  token: string,
  now = Date.now()
): AcceptInvitation {
  return db.transaction(
    (tx): AcceptInvitation => {
      const read = readInvitation(tx, token, personId, now);
      if (!read.ok) return { ok: false, reason: read.reason };
      if (read.fit !== 'ready') return { ok: false, reason: read.fit };
      const { id, teamId, teamSlug, role } = read.invitation;
      const { changes } = tx
        .update(invitation)
        .set({ acceptedAt: now })
        .where(and(eq(invitation.id, id), openWhere(now)))
        .run();
      if (changes === 0) return { ok: false, reason: 'used' };
      tx.insert(membership).values({ teamId, personId, role, createdAt: now }).run();
      recordEvent(tx, { action: 'invitation.accept', teamId, personId, thing: id, detail: { role } }, now);
      return { ok: true, teamSlug };
    },
    { behavior: 'immediate' }
  );
}
