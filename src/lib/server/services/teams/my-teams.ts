import type { Role } from '$lib/model/team/roles';
import { asc, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { membership, team } from '../../db/schema';

export interface MyTeam {
  slug: string;
  name: string;
  role: Role;
}

/** The teams a person is in, by name. */
export function myTeams(db: Database, personId: string): MyTeam[] {
  return db
    .select({ slug: team.slug, name: team.name, role: membership.role })
    .from(membership)
    .innerJoin(team, eq(team.id, membership.teamId))
    .where(eq(membership.personId, personId))
    .orderBy(asc(team.name), asc(team.slug))
    .all();
}
