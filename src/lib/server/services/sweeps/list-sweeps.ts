import type { SweepList } from '$lib/model/team/sweeps/sweep-list';
import { eq, inArray } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { person, sweep } from '../../db/schema';
import type { Actor } from '../access/actor';
import { newestPage } from '../paging/newest-page';
import { sweepColumns } from './sweep-columns';

/** One page of the team's sweeps, newest first. A page behind the last one gives the last one. */
export const listSweeps = (db: Database, actor: Actor, asked: number): SweepList =>
  newestPage(db, actor, sweep, asked, (ids) =>
    db
      .select(sweepColumns)
      .from(sweep)
      .leftJoin(person, eq(person.id, sweep.createdBy))
      .where(inArray(sweep.id, ids))
      .all()
  );
