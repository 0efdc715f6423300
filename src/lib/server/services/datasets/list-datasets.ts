import { and, count, eq, inArray, isNull } from 'drizzle-orm';
import type { DatasetList, DatasetRow } from '../../../model/team/datasets/dataset-list';
import type { DatasetQuery } from '../../../model/team/datasets/dataset-query';
import type { Database } from '../../db/client';
import { dataset, person } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { listOrder } from './list-order';
import { listWhere } from './list-where';
import { lastVerdict, reportCount } from './report-columns';

/**
 * One page of the team's datasets, filtered, sorted and counted in the database. A page behind the last one gives the
 * last one, as happens when filters are tightened.
 */
export function listDatasets(db: Database, actor: Actor, query: DatasetQuery): DatasetList {
  const where = listWhere(actor, query);
  const number = (condition: typeof where): number =>
    db.select({ total: count() }).from(dataset).where(condition).get()?.total ?? 0;
  const all = number(and(mayWhere(actor, 'see', dataset.teamId), isNull(dataset.deletedAt)));
  const total = number(where);
  const { size } = query;
  const page = Math.max(1, Math.min(query.page, Math.ceil(total / size)));
  // First the page's ids, by an index alone; then the lines. Joined and looked up for every row, the columns of a
  // line would make the sort ten times as slow.
  const ids = db
    .select({ id: dataset.id })
    .from(dataset)
    .where(where)
    .orderBy(...listOrder(query))
    .limit(size)
    .offset((page - 1) * size)
    .all()
    .map(({ id }) => id);
  const lines = new Map(linesOf(db, ids).map((row) => [row.id, row]));
  const rows = ids.flatMap((id) => lines.get(id) ?? []);
  return { rows, total, all, page, size };
}

function linesOf(db: Database, ids: string[]): DatasetRow[] {
  return db
    .select({
      id: dataset.id,
      name: dataset.name,
      device: dataset.device,
      firmware: dataset.firmware,
      group: dataset.group,
      quenchTime: dataset.quenchTime,
      quenchUnit: dataset.quenchUnit,
      geometry: dataset.geometry,
      unit: dataset.unit,
      trials: dataset.trials,
      shots: dataset.shots,
      mean: dataset.mean,
      largest: dataset.largest,
      measuredOn: dataset.measuredOn,
      createdAt: dataset.createdAt,
      by: person.name,
      reports: reportCount,
      verdict: lastVerdict
    })
    .from(dataset)
    .leftJoin(person, eq(person.id, dataset.createdBy))
    .where(inArray(dataset.id, ids))
    .all();
}
