import type { Role } from '$lib/model/team/roles';
import type { Database } from '$lib/server/db/client';
import { newId } from '$lib/server/db/new-id';
import { membership, person, team } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';

/** A person as one who came by mailed link: without a password. */
export function makePerson(db: Database, name = 'Ada Invented'): { id: string; email: string; name: string } {
  const id = newId();
  const made = { id, name, email: `${id}@example.org` };
  db.insert(person)
    .values({ ...made, emailVerifiedAt: 1, createdAt: 1 })
    .run();
  return made;
}

/** A team with nobody in it. */
export function makeTeam(
  db: Database,
  slug = `t-${newId().slice(0, 8)}`
): { id: string; slug: string; name: string } {
  const made = { id: newId(), slug, name: `Team ${slug}` };
  db.insert(team)
    .values({ ...made, createdAt: 1 })
    .run();
  return made;
}

/** A new person in a team, as services take one. */
export function makeMember(db: Database, teamId: string, role: Role): Actor {
  const { id: personId } = makePerson(db);
  db.insert(membership).values({ teamId, personId, role, createdAt: 1 }).run();
  return { personId, teamId, role };
}
