import { and, ne } from 'drizzle-orm';
import { teamName } from '$lib/model/team/members/team-name';
import type { Database } from '../../db/client';
import { team } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';

export type RenameTeam = { ok: true } | { ok: false; reason: 'not-allowed' | 'bad-name' };

/** Gives the team another name. Its address stays, so that links and bookmarks do. */
export function renameTeam(db: Database, actor: Actor, name: string, now = Date.now()): RenameTeam {
  const read = teamName.safeParse(name);
  if (!read.success) return { ok: false, reason: 'bad-name' };
  return db.transaction(
    (tx): RenameTeam => {
      const ours = mayWhere(actor, 'manage', team.id);
      const before = tx.select({ name: team.name }).from(team).where(ours).get();
      if (!before) return { ok: false, reason: 'not-allowed' };
      const { changes } = tx
        .update(team)
        .set({ name: read.data })
        .where(and(ours, ne(team.name, read.data)))
        .run();
      if (changes === 1)
        recordEvent(
          tx,
          {
            action: 'team.rename',
            teamId: actor.teamId,
            personId: actor.personId,
            thing: actor.teamId,
            detail: { from: before.name, to: read.data }
          },
          now
        );
      return { ok: true };
    },
    { behavior: 'immediate' }
  );
}
