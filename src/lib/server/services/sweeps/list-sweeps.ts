import type { SweepList, SweepRow } from '$lib/model/team/sweeps/sweep-list';
import { and, count, desc, eq, inArray, isNull, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { person, sweep } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { sweepColumns } from './sweep-columns';

const SIZE = 25;

/** One page of the team's sweeps, newest first. A page behind the last one gives the last one. */
export function listSweeps(db: Database, actor: Actor, asked: number): SweepList {
  const here = and(mayWhere(actor, 'see', sweep.teamId), isNull(sweep.deletedAt));
  const total = db.select({ total: count() }).from(sweep).where(here).get()?.total ?? 0;
  const page = Math.max(1, Math.min(asked, Math.ceil(total / SIZE)));
  // Ids first and lines afterwards: documents are long, and a sort must not carry them along.
  const ids = db
    .select({ id: sweep.id })
    .from(sweep)
    .where(here)
    .orderBy(desc(sweep.createdAt), desc(sql`${sweep}.rowid`))
    .limit(SIZE)
    .offset((page - 1) * SIZE)
    .all()
    .map(({ id }) => id);
  const lines = new Map(linesOf(db, ids).map((row) => [row.id, row]));
  return { rows: ids.flatMap((id) => lines.get(id) ?? []), total, all: total, page, size: SIZE };
}

function linesOf(db: Database, ids: string[]): SweepRow[] {
  return db
    .select(sweepColumns)
    .from(sweep)
    .leftJoin(person, eq(person.id, sweep.createdBy))
    .where(inArray(sweep.id, ids))
    .all();
}
