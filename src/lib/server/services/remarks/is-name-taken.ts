import { nameKey } from '$lib/model/team/remarks/name-key';
import { eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { membership, person, team } from '../../db/schema';
import { THE_TEAM } from './the-team';

/**
 * Whether a reader of a link may not sign with a name, since it would be read as the team's: "The team", the name of the
 * team or of a member, case, accents, spaces and punctuation aside. Members who came by a link sign with their own.
 *
 * A blind link refuses "The team" alone: it never shows the other names, and refusing them would let a referee find out
 * by trying whose report it is.
 */
export function isNameTaken(
  db: Pick<Database, 'select'>,
  { name, teamId, personId, blind }: { name: string; teamId: string; personId: string | null; blind: boolean }
): boolean {
  const key = nameKey(name);
  if (key === '') return false;
  if (key === nameKey(THE_TEAM)) return true;
  if (blind) return false;
  const members = db
    .select({ id: person.id, name: person.name })
    .from(membership)
    .innerJoin(person, eq(person.id, membership.personId))
    .where(eq(membership.teamId, teamId))
    .all();
  if (personId !== null && members.some(({ id }) => id === personId)) return false;
  const ours = db.select({ name: team.name }).from(team).where(eq(team.id, teamId)).all();
  return [...ours, ...members].some((other) => nameKey(other.name) === key);
}
