import { asc, eq, sql } from 'drizzle-orm';
import type { Role } from '$lib/model/team/roles';
import type { Database } from '../../db/client';
import { membership, person } from '../../db/schema';
import { mayWhere } from '../access/may-where';
import type { Actor } from '../access/actor';

export interface Member {
  personId: string;
  name: string;
  email: string;
  role: Role;
  /** Milliseconds since 1970. */
  since: number;
  /** Cannot sign in at present. */
  disabled: boolean;
}

/** Who is in the team: leads first, then by name. For leads alone; others get an empty list. */
export function members(db: Database, actor: Actor): Member[] {
  return db
    .select({
      personId: person.id,
      name: person.name,
      email: person.email,
      role: membership.role,
      since: membership.createdAt,
      disabled: sql<number>`${person.disabledAt} is not null`.mapWith(Boolean)
    })
    .from(membership)
    .innerJoin(person, eq(person.id, membership.personId))
    .where(mayWhere(actor, 'manage', membership.teamId))
    .orderBy(
      sql`case ${membership.role} when 'lead' then 0 when 'experimenter' then 1 else 2 end`,
      asc(sql`lower(${person.name})`),
      asc(person.id)
    )
    .all();
}
