import type { SweepRow } from '$lib/model/team/sweeps/sweep-list';
import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { person, sweep } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { onePage, type Paged } from '../paging/one-page';
import { sweepColumns } from './sweep-columns';

export interface AskedSweeps {
  limit: number;
  after?: string;
  axis?: SweepRow['axis'];
}

/** The team's sweeps page by page, newest first; not those put aside. */
export function pageOfSweeps(db: Database, actor: Actor, asked: AskedSweeps): Paged<SweepRow> {
  const mine = and(
    mayWhere(actor, 'see', sweep.teamId),
    isNull(sweep.deletedAt),
    asked.axis === undefined ? undefined : eq(sweepColumns.axis, asked.axis)
  );
  return onePage({ at: sweep.createdAt, id: sweep.id }, asked, (where, order, limit) => {
    // Ids by the index first: a sort must not carry documents along.
    const ids = db
      .select({ id: sweep.id })
      .from(sweep)
      .where(and(mine, where))
      .orderBy(...order)
      .limit(limit)
      .all()
      .map(({ id }) => id);
    return db
      .select(sweepColumns)
      .from(sweep)
      .leftJoin(person, eq(person.id, sweep.createdBy))
      .where(inArray(sweep.id, ids))
      .orderBy(...order)
      .all();
  });
}
