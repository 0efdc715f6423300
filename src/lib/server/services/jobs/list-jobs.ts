import { and, count, desc, eq, inArray, sql } from 'drizzle-orm';
import type { JobQuery } from '../../../model/team/jobs/job-query';
import type { JobList, JobStatus } from '../../../model/team/jobs/job-row';
import type { Database } from '../../db/client';
import { job } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { jobRows, toJobRow } from './job-rows';

const SIZE = 50;

const STATUSES: Record<JobQuery['show'], JobStatus[] | null> = {
  all: null,
  active: ['queued', 'running'],
  done: ['done'],
  failed: ['failed', 'cancelled']
};

/** One page of the team's jobs; a page behind the last gives the last. */
export function listJobs(db: Database, actor: Actor, query: JobQuery, now = Date.now()): JobList {
  const seen = mayWhere(actor, 'see', job.teamId);
  const statuses = STATUSES[query.show];
  const counts = db
    .select({ status: job.status, jobs: count() })
    .from(job)
    .where(seen)
    .groupBy(job.status)
    .all();
  const number = (wanted: JobStatus[] | null) =>
    counts.reduce((sum, { status, jobs }) => sum + (!wanted || wanted.includes(status) ? jobs : 0), 0);
  const total = number(statuses);
  const page = Math.max(1, Math.min(query.page, Math.ceil(total / SIZE)));
  const rows = jobRows(db)
    .where(and(seen, statuses ? inArray(job.status, statuses) : undefined))
    .orderBy(
      sql`case ${job.status} when 'running' then 0 when 'queued' then 1 else 2 end`,
      desc(job.endedAt),
      job.createdAt,
      sql`job.rowid`
    )
    .limit(SIZE)
    .offset((page - 1) * SIZE)
    .all()
    .map((row) => toJobRow(row, now));
  return { rows, total, queued: number(['queued']), running: number(['running']), page, size: SIZE };
}

/** Some jobs of the team by their ids; those that are not the team's are left out. */
export function jobsByIds(db: Database, actor: Actor, ids: string[], now = Date.now()) {
  return jobRows(db)
    .where(and(inArray(job.id, ids), mayWhere(actor, 'see', job.teamId)))
    .all()
    .map((row) => toJobRow(row, now));
}

/** All jobs of the team that run, or ended since a moment. */
export function livelyJobs(db: Database, actor: Actor, since: number, now = Date.now()) {
  return jobRows(db)
    .where(
      and(
        mayWhere(actor, 'see', job.teamId),
        sql`(${eq(job.status, 'running')} or ${job.endedAt} >= ${since})`
      )
    )
    .all()
    .map((row) => toJobRow(row, now));
}
