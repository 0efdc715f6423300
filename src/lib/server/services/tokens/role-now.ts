import type { Role } from '$lib/model/team/roles';
import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { membership } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

/** The role that an actor has in the team as the database knows it now; null for who may make no tokens there. */
export function roleNow(db: Pick<Database, 'select'>, actor: Actor): Role | null {
  const mine = and(
    eq(membership.personId, actor.personId),
    mayWhere(actor, 'script', membership.teamId, membership.personId)
  );
  return db.select({ role: membership.role }).from(membership).where(mine).get()?.role ?? null;
}
