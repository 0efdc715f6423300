import { sql, type SQL } from 'drizzle-orm';
import type { DatasetQuery, Sort } from '../../../model/team/datasets/dataset-query';
import { dataset, person } from '../../db/schema';
import { lastVerdict, reportCount } from './report-columns';
import { timeInSeconds } from './time-in-seconds';

const columns: Record<Sort, SQL> = {
  name: sql`${dataset.name} collate nocase`,
  device: sql`${dataset.device} collate nocase`,
  firmware: sql`${dataset.firmware} collate nocase`,
  group: sql`${dataset.group} collate nocase`,
  quench: timeInSeconds(dataset.quenchTime, dataset.quenchUnit),
  geometry: sql`${dataset.geometry}`,
  unit: sql`${dataset.unit}`,
  trials: sql`${dataset.trials}`,
  shots: sql`${dataset.shots}`,
  mean: sql`${dataset.mean}`,
  largest: sql`${dataset.largest}`,
  measured: sql`${dataset.measuredOn}`,
  created: sql`${dataset.createdAt}`,
  by: sql`(select ${person.name} from ${person} where ${person.id} = ${dataset.createdBy}) collate nocase`,
  reports: reportCount,
  verdict: lastVerdict
};

/** Columns that never are null: asking would keep the index of the table's usual order from being used. */
const always: Sort[] = ['name', 'geometry', 'unit', 'shots', 'mean', 'largest', 'created', 'reports'];

/**
 * Order of the table: what is not stated comes last either way, and equal lines keep one order over all pages. Datasets
 * saved together have one time: they stay as they stood in the file, which is the order of their row numbers. Every
 * index ends in the row number, and a VACUUM may number anew but keeps the order.
 */
export function listOrder({ sort, order }: DatasetQuery): SQL[] {
  const direction = sql.raw(order === 'up' ? 'asc' : 'desc');
  const column = columns[sort];
  return [
    ...(always.includes(sort) ? [] : [sql`${column} is null`]),
    sql`${column} ${direction}`,
    ...(sort === 'created' ? [] : [sql`${dataset.createdAt} desc`]),
    sql`${dataset}.rowid`
  ];
}
