import { asc, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { membership, person, team } from '../../db/schema';

export interface ListedPerson {
  email: string;
  name: string;
  disabled: boolean;
  hasPassword: boolean;
  /** "SLUG (role)" for each team. */
  teams: string[];
}

/** Everybody with an account, by address: for whoever runs the server. */
export function listPeople(db: Database): ListedPerson[] {
  const teams = new Map<string, string[]>();
  const memberships = db
    .select({ personId: membership.personId, slug: team.slug, role: membership.role })
    .from(membership)
    .innerJoin(team, eq(team.id, membership.teamId))
    .orderBy(asc(team.slug))
    .all();
  for (const { personId, slug, role } of memberships)
    teams.set(personId, [...(teams.get(personId) ?? []), `${slug} (${role})`]);
  return db
    .select()
    .from(person)
    .orderBy(asc(person.email))
    .all()
    .map((row) => ({
      email: row.email,
      name: row.name,
      disabled: row.disabledAt !== null,
      hasPassword: row.passwordHash !== null,
      teams: teams.get(row.id) ?? []
    }));
}
