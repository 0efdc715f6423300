import type { WatchForm } from '$lib/model/watches/watch-form';
import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { membership, person, team, watch } from '../../db/schema';
import { newestEvent } from '../events/newest-event';
import { readAbout } from './watch-about';

export type SavedWatch = { ok: true; team: string } | { ok: false; reason: 'unknown' };

/**
 * Keeps what a member wants to hear of a team. A kind that is new is told from now on; one that was chosen before goes
 * on where it was. With nothing chosen the watch is gone.
 */
export function saveWatch(
  db: Database,
  personId: string,
  slug: string,
  { about, rhythm }: WatchForm,
  now = Date.now()
): SavedWatch {
  return db.transaction(
    (tx): SavedWatch => {
      const found = tx
        .select({ id: team.id, name: team.name })
        .from(membership)
        .innerJoin(team, eq(team.id, membership.teamId))
        .innerJoin(person, eq(person.id, membership.personId))
        .where(and(eq(team.slug, slug), eq(membership.personId, personId), isNull(person.disabledAt)))
        .get();
      if (!found) return { ok: false, reason: 'unknown' };
      const mine = and(eq(watch.personId, personId), eq(watch.teamId, found.id));
      const before = tx.select().from(watch).where(mine).get();
      const newest = newestEvent(tx);
      const had = before ? readAbout(before.about) : {};
      const kinds = Object.fromEntries(about.map((kind) => [kind, had[kind] ?? newest]));
      if (about.length === 0) tx.delete(watch).where(mine).run();
      else if (before)
        tx.update(watch)
          .set({ about: JSON.stringify(kinds), rhythm, updatedAt: now })
          .where(mine)
          .run();
      else
        tx.insert(watch)
          .values({
            personId,
            teamId: found.id,
            about: JSON.stringify(kinds),
            rhythm,
            lastEvent: newest,
            updatedAt: now
          })
          .run();
      return { ok: true, team: found.name };
    },
    { behavior: 'immediate' }
  );
}
