import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { membership, watch } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';
import { anotherLead } from './another-lead';

export type RemoveMember = { ok: true } | { ok: false; reason: 'unknown' | 'last-lead' };

/**
 * Takes somebody out of the team: by a lead, or oneself by leaving. Every request asks the membership, so access ends
 * with it; what the person made stays with the team.
 */
export function removeMember(db: Database, actor: Actor, personId: string, now = Date.now()): RemoveMember {
  const leaving = personId === actor.personId;
  return db.transaction(
    (tx): RemoveMember => {
      const theirs = and(
        eq(membership.personId, personId),
        mayWhere(actor, leaving ? 'see' : 'manage', membership.teamId)
      );
      const before = tx.select({ role: membership.role }).from(membership).where(theirs).get();
      if (!before) return { ok: false, reason: 'unknown' };
      const { changes } = tx.delete(membership).where(and(theirs, anotherLead())).run();
      if (changes === 0) return { ok: false, reason: 'last-lead' };
      // Who comes back some day is not mailed what happened meanwhile.
      tx.delete(watch)
        .where(and(eq(watch.personId, personId), eq(watch.teamId, actor.teamId)))
        .run();
      recordEvent(
        tx,
        {
          action: leaving ? 'member.leave' : 'member.remove',
          teamId: actor.teamId,
          personId: actor.personId,
          thing: personId,
          detail: { role: before.role }
        },
        now
      );
      return { ok: true };
    },
    { behavior: 'immediate' }
  );
}
