import { and, inArray, sql } from 'drizzle-orm';
import type { JobRow } from '../../../model/team/jobs/job-row';
import type { Database } from '../../db/client';
import { job } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { jobRows, toJobRow } from './job-rows';

/**
 * The latest job of each of a set of datasets: the one that runs or waits where there is one, else the last that was
 * asked for. Datasets without a job, or of another team, are left out.
 */
export function jobStatuses(
  db: Database,
  actor: Actor,
  datasetIds: string[],
  now = Date.now()
): Record<string, JobRow> {
  const rows = jobRows(db)
    .where(and(inArray(job.datasetId, datasetIds), mayWhere(actor, 'see', job.teamId)))
    .orderBy(
      sql`case ${job.status} when 'running' then 2 when 'queued' then 1 else 0 end`,
      job.createdAt,
      sql`job.rowid`
    )
    .all();
  // A later entry replaces an earlier one of the same dataset.
  return Object.fromEntries(rows.map((row) => [row.dataset.id, toJobRow(row, now)]));
}
