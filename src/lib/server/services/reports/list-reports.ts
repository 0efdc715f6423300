import type { ReportList, ReportRow } from '$lib/model/team/reports/report-list';
import type { ReportQuery, ReportSort } from '$lib/model/team/reports/report-query';
import { and, count, eq, inArray, isNull, sql, type SQL } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, person, report } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { openThreads, threads } from './thread-counts';

/**
 * One page of the team's reports, filtered, sorted and counted in the database. A page behind the last one gives the
 * last one, as happens when filters are tightened.
 */
export function listReports(db: Database, actor: Actor, query: ReportQuery): ReportList {
  const here = and(
    mayWhere(actor, 'see', report.teamId),
    isNull(report.deletedAt),
    isNull(dataset.deletedAt)
  );
  const where = and(here, ...filters(query));
  const howMany = (condition: SQL | undefined): number =>
    db
      .select({ total: count() })
      .from(report)
      .innerJoin(dataset, eq(dataset.id, report.datasetId))
      .where(condition)
      .get()?.total ?? 0;
  const all = howMany(here);
  const total = howMany(where);
  const { size } = query;
  const page = Math.max(1, Math.min(query.page, Math.ceil(total / size)));
  // Ids first and lines afterwards: documents are long, and a sort must not carry them along.
  const ids = db
    .select({ id: report.id })
    .from(report)
    .innerJoin(dataset, eq(dataset.id, report.datasetId))
    .where(where)
    .orderBy(...order(query))
    .limit(size)
    .offset((page - 1) * size)
    .all()
    .map(({ id }) => id);
  const lines = new Map(linesOf(db, ids).map((row) => [row.id, row]));
  return { rows: ids.flatMap((id) => lines.get(id) ?? []), total, all, page, size };
}

function filters(query: ReportQuery): (SQL | undefined)[] {
  return [
    ...query.q.split(/\s+/).filter(Boolean).map(mentions),
    query.verdict ? eq(report.verdict, query.verdict) : undefined,
    query.device ? eq(dataset.device, query.device) : undefined,
    query.dataset ? eq(dataset.id, query.dataset) : undefined,
    query.remarks === 'open' ? sql`${openThreads} > 0` : undefined
  ];
}

/** Each word of a search must stand somewhere in the dataset; capital and small letters (of ASCII) are the same. */
function mentions(word: string): SQL {
  const pattern = `%${word.replace(/[\\%_]/g, '\\$&')}%`;
  const text = sql`${dataset.name} || char(10) || ifnull(${dataset.device}, '') || char(10) || ifnull(${dataset.firmware}, '')
    || char(10) || ifnull(${dataset.group}, '') || char(10) || ifnull(${dataset.notes}, '')`;
  return sql`(${text}) like ${pattern} escape '\\'`;
}

const columns: Record<ReportSort, SQL> = {
  made: sql`${report.createdAt}`,
  dataset: sql`${dataset.name} collate nocase`,
  device: sql`${dataset.device} collate nocase`,
  verdict: sql`${report.verdict}`,
  shots: sql`${dataset.shots}`,
  by: sql`(select ${person.name} from ${person} where ${person.id} = ${report.createdBy}) collate nocase`
};

/** What is not stated comes last either way; of equal lines the one saved last comes first, over all pages. */
function order({ sort, order }: ReportQuery): SQL[] {
  const direction = sql.raw(order === 'up' ? 'asc' : 'desc');
  const column = columns[sort];
  return [
    ...(sort === 'device' || sort === 'by' ? [sql`${column} is null`] : []),
    sql`${column} ${direction}`,
    ...(sort === 'made' ? [] : [sql`${report.createdAt} desc`]),
    sql`${report}.rowid ${sort === 'made' ? direction : sql.raw('desc')}`
  ];
}

function linesOf(db: Database, ids: string[]): ReportRow[] {
  return db
    .select({
      id: report.id,
      number: report.number,
      datasetId: report.datasetId,
      dataset: dataset.name,
      device: dataset.device,
      firmware: dataset.firmware,
      group: dataset.group,
      shots: dataset.shots,
      verdict: report.verdict,
      engineVersion: report.engineVersion,
      by: person.name,
      createdAt: report.createdAt,
      threads,
      open: openThreads
    })
    .from(report)
    .innerJoin(dataset, eq(dataset.id, report.datasetId))
    .leftJoin(person, eq(person.id, report.createdBy))
    .where(inArray(report.id, ids))
    .all();
}
