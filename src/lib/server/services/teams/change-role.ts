import { and, eq } from 'drizzle-orm';
import type { Role } from '$lib/model/team/roles';
import type { Database } from '../../db/client';
import { membership } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';
import { anotherLead } from './another-lead';

export type ChangeRole =
  | { ok: true }
  /** `unknown`: nobody of that id is in the team, or the actor may not; `last-lead`: the team would have none. */
  | { ok: false; reason: 'unknown' | 'last-lead' };

/** Gives a member another role. A lead may step down while another lead stays. */
export function changeRole(
  db: Database,
  actor: Actor,
  personId: string,
  role: Role,
  now = Date.now()
): ChangeRole {
  return db.transaction(
    (tx): ChangeRole => {
      const theirs = and(eq(membership.personId, personId), mayWhere(actor, 'manage', membership.teamId));
      const before = tx.select({ role: membership.role }).from(membership).where(theirs).get();
      if (!before) return { ok: false, reason: 'unknown' };
      if (before.role === role) return { ok: true };
      const { changes } = tx.update(membership).set({ role }).where(and(theirs, anotherLead())).run();
      if (changes === 0) return { ok: false, reason: 'last-lead' };
      recordEvent(
        tx,
        {
          action: 'member.role',
          teamId: actor.teamId,
          personId: actor.personId,
          thing: personId,
          detail: { from: before.role, to: role }
        },
        now
      );
      return { ok: true };
    },
    { behavior: 'immediate' }
  );
}
