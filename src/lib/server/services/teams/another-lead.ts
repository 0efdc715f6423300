import { sql, type SQL } from 'drizzle-orm';
import { membership } from '../../db/schema';

/**
 * For the where clause of whatever takes a membership away or lowers it: the row is no lead's, or the team keeps
 * another lead who can sign in. It stands in the very statement that writes, so that of two people who do it at once
 * the second finds no row; a check before the write would let both pass.
 */
export function anotherLead(): SQL {
  return sql`(${membership.role} <> 'lead' or exists (select 1 from membership other
    join person on person.id = other.person_id and person.disabled_at is null
    where other.team_id = ${membership.teamId} and other.role = 'lead' and other.person_id <> ${membership.personId}))`;
}
