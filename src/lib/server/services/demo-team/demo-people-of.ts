import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { membership, person, team } from '../../db/schema';
import { DEMO_PEOPLE, DEMO_TEAM } from './demo-people';

/** Those of the demo people who can still sign in and still have their role. */
export function demoPeopleOf(db: Database): typeof DEMO_PEOPLE {
  const rows = db
    .select({ email: person.email, role: membership.role })
    .from(person)
    .innerJoin(membership, eq(membership.personId, person.id))
    .innerJoin(team, eq(team.id, membership.teamId))
    .where(
      and(
        eq(team.slug, DEMO_TEAM.slug),
        isNull(person.disabledAt),
        inArray(
          person.email,
          DEMO_PEOPLE.map(({ email }) => email)
        )
      )
    )
    .all();
  return DEMO_PEOPLE.filter(({ email, role }) =>
    rows.some((row) => row.email === email && row.role === role)
  );
}
