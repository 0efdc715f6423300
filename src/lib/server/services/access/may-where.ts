import { sql, type SQL } from 'drizzle-orm';
import type { SQLiteColumn } from 'drizzle-orm/sqlite-core';
import type { Action } from '../../access/actions';
import { rolesFor } from '../../access/roles-for';
import type { Actor } from './actor';

/**
 * The decision of `can`, as a condition for a where clause: the row is of the actor's team, and the actor is in it now,
 * with a role that may, as may the role of the token that a script of theirs came with. A membership that ended a
 * moment ago, or a route that forgot to ask, finds no row.
 *
 * @param teamId column that names the row's team
 * @param createdBy column that names who made the row; without it `own` grants count as not granted
 */
export function mayWhere(actor: Actor, action: Action, teamId: SQLiteColumn, createdBy?: SQLiteColumn): SQL {
  const list = (roles: string[]) =>
    sql.join(
      roles.map((role) => sql`${role}`),
      sql`, `
    );
  const full = rolesFor(action, 'yes', actor.token?.role);
  const own = createdBy ? rolesFor(action, 'own', actor.token?.role) : [];
  const role = sql`(m.role in (${list(full)})${
    own.length > 0 ? sql` or (m.role in (${list(own)}) and ${createdBy} = ${actor.personId})` : sql``
  })`;
  return sql`${teamId} = ${actor.teamId} and exists (select 1 from membership m join person p on p.id = m.person_id
    where m.team_id = ${actor.teamId} and m.person_id = ${actor.personId} and p.disabled_at is null and ${role})`;
}
