import { and, count, eq, isNull } from 'drizzle-orm';
import type { Role } from '$lib/model/team/roles';
import { newToken } from '../../auth/new-token';
import { normalEmail } from '../../auth/normal-email';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { invitation, membership, person, team } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';
import { INVITATION_LIFE, MOST_OPEN } from './life';
import { mailInvitation, type Mailed } from './mail-invitation';
import { openWhere } from './open-where';

export type Invite =
  | ({ ok: true; id: string } & Mailed)
  /** `member`: already in the team; `invited`: an open invitation is there, which can be sent again. */
  | { ok: false; reason: 'not-allowed' | 'member' | 'invited' | 'too-many' };

/**
 * Invites an address into the team, for 14 days, and mails it the token, of which only the hash is kept. The
 * invitation is made before the mail is sent: a mail that does not go leaves one that can be sent again.
 *
 * @param addressOf the address of the page that a token opens
 */
export async function invite(
  db: Database,
  actor: Actor,
  { email: typed, role }: { email: string; role: Role },
  addressOf: (token: string) => string,
  now = Date.now()
): Promise<Invite> {
  const email = normalEmail(typed);
  const { token, hash } = newToken();
  const id = newId();
  const expiresAt = now + INVITATION_LIFE;
  const made = db.transaction(
    (tx): Exclude<Invite, { ok: true }> | null => {
      const may = tx
        .select({ id: team.id })
        .from(team)
        .where(mayWhere(actor, 'manage', team.id))
        .get();
      if (!may) return { ok: false, reason: 'not-allowed' };
      const inIt = tx
        .select({ id: person.id })
        .from(membership)
        .innerJoin(person, eq(person.id, membership.personId))
        .where(and(eq(membership.teamId, actor.teamId), eq(person.email, email)))
        .get();
      if (inIt) return { ok: false, reason: 'member' };
      const open = and(eq(invitation.teamId, actor.teamId), openWhere(now));
      const theirs = and(eq(invitation.teamId, actor.teamId), eq(invitation.email, email));
      if (tx.select({ id: invitation.id }).from(invitation).where(and(theirs, open)).get())
        return { ok: false, reason: 'invited' };
      if ((tx.select({ n: count() }).from(invitation).where(open).get()?.n ?? 0) >= MOST_OPEN)
        return { ok: false, reason: 'too-many' };
      // One that ran out would stand beside the new one in the list.
      tx.update(invitation)
        .set({ revokedAt: now })
        .where(and(theirs, isNull(invitation.acceptedAt), isNull(invitation.revokedAt)))
        .run();
      tx.insert(invitation)
        .values({
          id,
          teamId: actor.teamId,
          email,
          role,
          tokenHash: hash,
          invitedBy: actor.personId,
          createdAt: now,
          expiresAt
        })
        .run();
      recordEvent(
        tx,
        {
          action: 'invitation.make',
          teamId: actor.teamId,
          personId: actor.personId,
          thing: id,
          detail: { email, role }
        },
        now
      );
      return null;
    },
    { behavior: 'immediate' }
  );
  if (made) return made;
  const mailed = await mailInvitation(db, actor, { email, role, address: addressOf(token), expiresAt });
  return { ok: true, id, ...mailed };
}
