import { and, count, desc, isNull, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import type { siteMap, sweep } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

const SIZE = 25;

export interface NewestPage<Row> {
  rows: Row[];
  total: number;
  all: number;
  page: number;
  size: number;
}

/**
 * One page of the team's documents of a table, newest first; not those put aside. A page behind the last one gives
 * the last one.
 *
 * @param asked counted from 1
 * @param linesOf the lines of these ids, in any order
 */
export function newestPage<Row extends { id: string }>(
  db: Database,
  actor: Actor,
  of: typeof sweep | typeof siteMap,
  asked: number,
  linesOf: (ids: string[]) => Row[]
): NewestPage<Row> {
  // Drizzle has no type for a table that is one of several; these columns are common to them.
  const table = of as typeof sweep;
  const here = and(mayWhere(actor, 'see', table.teamId), isNull(table.deletedAt));
  const total = db.select({ total: count() }).from(table).where(here).get()?.total ?? 0;
  const page = Math.max(1, Math.min(asked, Math.ceil(total / SIZE)));
  // Ids first and lines afterwards: documents are long, and a sort must not carry them along.
  const ids = db
    .select({ id: table.id })
    .from(table)
    .where(here)
    .orderBy(desc(table.createdAt), desc(sql`${table}.rowid`))
    .limit(SIZE)
    .offset((page - 1) * SIZE)
    .all()
    .map(({ id }) => id);
  const lines = new Map(linesOf(ids).map((row) => [row.id, row]));
  return { rows: ids.flatMap((id) => lines.get(id) ?? []), total, all: total, page, size: SIZE };
}
