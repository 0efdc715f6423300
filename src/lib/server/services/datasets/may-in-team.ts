import type { Action } from '../../access/actions';
import type { Database } from '../../db/client';
import { team } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

/** Whether an actor may do something in the team as a whole, asked of the database as it is now. */
export function mayInTeam(db: Pick<Database, 'select'>, actor: Actor, action: Action): boolean {
  const found = db
    .select({ id: team.id })
    .from(team)
    .where(mayWhere(actor, action, team.id))
    .get();
  return found !== undefined;
}
