import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { person, team, watch } from '../../db/schema';
import type { Unsubscribing } from './unsubscribe-token';

const which = ({ personId, teamId }: Unsubscribing) =>
  and(eq(watch.personId, personId), teamId === null ? undefined : eq(watch.teamId, teamId));

/** Ends somebody's mail of one team, or of all; what had ended before stays so. */
export function stopWatching(db: Database, whose: Unsubscribing): void {
  db.delete(watch).where(which(whose)).run();
}

/** The teams whose mail would end, by name; none when it had ended before, or nobody has that account. */
export function watchedTeams(db: Database, whose: Unsubscribing): string[] {
  return db
    .select({ name: team.name })
    .from(watch)
    .innerJoin(team, eq(team.id, watch.teamId))
    .innerJoin(person, eq(person.id, watch.personId))
    .where(which(whose))
    .all()
    .map(({ name }) => name)
    .sort();
}
