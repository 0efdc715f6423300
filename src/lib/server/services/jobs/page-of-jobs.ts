import { and, eq, inArray } from 'drizzle-orm';
import type { JobRow, JobStatus } from '../../../model/team/jobs/job-row';
import type { Database } from '../../db/client';
import { job } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { onePage, type Paged } from '../paging/one-page';
import { jobRows, toJobRow } from './job-rows';

/** The team's jobs page by page for a script, newest first, whatever came of them. */
export function pageOfJobs(
  db: Database,
  actor: Actor,
  asked: { limit: number; after?: string; dataset?: string; status?: JobStatus },
  now = Date.now()
): Paged<JobRow> {
  const mine = and(
    mayWhere(actor, 'see', job.teamId),
    asked.dataset === undefined ? undefined : eq(job.datasetId, asked.dataset),
    asked.status === undefined ? undefined : eq(job.status, asked.status)
  );
  return onePage({ at: job.createdAt, id: job.id }, asked, (where, order, limit) => {
    const ids = db
      .select({ id: job.id })
      .from(job)
      .where(and(mine, where))
      .orderBy(...order)
      .limit(limit)
      .all()
      .map(({ id }) => id);
    return jobRows(db)
      .where(inArray(job.id, ids))
      .orderBy(...order)
      .all()
      .map((row) => toJobRow(row, now));
  });
}
