import { and, asc, count, desc, eq, inArray, isNull, sql } from 'drizzle-orm';
import type { TeamHome } from '$lib/model/team/home/team-home';
import type { Database } from '../../db/client';
import { dataset, job, link, remark, report } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { listReports } from '../reports/list-reports';

/** Lines of each list: the first page says what is new, and the others show all. */
const LINES = 6;
/** Characters of a remark that are shown. */
const EXCERPT = 160;

/** What is new and what waits in a team: reports, datasets without one, open remarks, jobs under way. */
export function teamHome(db: Database, actor: Actor): TeamHome {
  const filters = { q: '', verdict: '', device: '', dataset: '', remarks: '' } as const;
  const listed = listReports(db, actor, { ...filters, sort: 'made', order: 'down', page: 1, size: LINES });
  return {
    reports: {
      total: listed.all,
      newest: listed.rows.map(({ id, number, dataset, verdict, createdAt, by }) => ({
        id,
        number,
        dataset,
        verdict,
        createdAt,
        by
      }))
    },
    datasets:
      db
        .select({ n: count() })
        .from(dataset)
        .where(and(mayWhere(actor, 'see', dataset.teamId), isNull(dataset.deletedAt)))
        .get()?.n ?? 0,
    waiting: waiting(db, actor),
    remarks: remarks(db, actor),
    jobs: jobs(db, actor)
  };
}

function waiting(db: Database, actor: Actor): TeamHome['waiting'] {
  const where = and(
    mayWhere(actor, 'see', dataset.teamId),
    isNull(dataset.deletedAt),
    sql`not exists (select 1 from report r where r.dataset_id = ${dataset.id} and r.deleted_at is null)`
  );
  const total = db.select({ n: count() }).from(dataset).where(where).get()?.n ?? 0;
  const newest = db
    .select({ id: dataset.id, name: dataset.name, shots: dataset.shots, createdAt: dataset.createdAt })
    .from(dataset)
    .where(where)
    .orderBy(desc(dataset.createdAt), sql`${dataset}.rowid`)
    .limit(LINES)
    .all();
  return { total, newest };
}

function remarks(db: Database, actor: Actor): TeamHome['remarks'] {
  const where = and(
    mayWhere(actor, 'see', report.teamId),
    isNull(report.deletedAt),
    isNull(dataset.deletedAt),
    isNull(remark.threadId),
    isNull(remark.settledAt)
  );
  const last = sql<number>`(select max(a.created_at) from remark a
    where a.id = ${remark.id} or a.thread_id = ${remark.id})`;
  const total =
    db
      .select({ n: count() })
      .from(remark)
      .innerJoin(report, eq(report.id, remark.reportId))
      .innerJoin(dataset, eq(dataset.id, report.datasetId))
      .where(where)
      .get()?.n ?? 0;
  const newest = db
    .select({
      id: remark.id,
      reportId: report.id,
      number: report.number,
      dataset: dataset.name,
      section: remark.section,
      body: sql<string>`substr(${remark.body}, 1, ${EXCERPT + 1})`,
      by: sql<string>`case when ${link.hidesReferees} then 'A referee' else ${remark.signedAs} end`,
      at: last
    })
    .from(remark)
    .innerJoin(report, eq(report.id, remark.reportId))
    .innerJoin(dataset, eq(dataset.id, report.datasetId))
    .leftJoin(link, eq(link.id, remark.linkId))
    .where(where)
    .orderBy(desc(last), desc(remark.id))
    .limit(LINES)
    .all()
    .map((row) => ({
      ...row,
      body: row.body.length > EXCERPT ? `${row.body.slice(0, EXCERPT)}…` : row.body
    }));
  return { total, newest };
}

function jobs(db: Database, actor: Actor): TeamHome['jobs'] {
  const where = and(mayWhere(actor, 'see', job.teamId), inArray(job.status, ['queued', 'running']));
  const total = db.select({ n: count() }).from(job).where(where).get()?.n ?? 0;
  const first = db
    .select({
      id: job.id,
      dataset: dataset.name,
      running: sql<number>`${job.status} = 'running'`.mapWith(Boolean),
      share: job.share
    })
    .from(job)
    .innerJoin(dataset, eq(dataset.id, job.datasetId))
    .where(where)
    .orderBy(desc(job.status), asc(job.createdAt))
    .limit(LINES)
    .all();
  return { total, first };
}
