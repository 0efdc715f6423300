import { and, eq, gte, inArray, isNull, lte, sql, type SQL } from 'drizzle-orm';
import type { DatasetQuery } from '../../../model/team/datasets/dataset-query';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { reportCount, lastVerdict } from './report-columns';
import { secondsIn } from '$lib/model/seconds-in';
import { timeInSeconds } from './time-in-seconds';

/** Units that are compared with each other. */
const known = ['ns', 'µs', 'us', 'ms', 's'];
/** Times are kept as binary fractions: 2 µs in seconds must not fall outside "from 2000 ns" by its last digit. */
const SLACK = 1e-9;

/** The datasets that a query asks for, as a condition: those of the actor's team that are not put aside. */
export function listWhere(actor: Actor, query: DatasetQuery): SQL | undefined {
  return and(
    mayWhere(actor, 'see', dataset.teamId),
    isNull(dataset.deletedAt),
    ...query.q.split(/\s+/).filter(Boolean).map(mentions),
    query.device ? eq(dataset.device, query.device) : undefined,
    query.firmware ? eq(dataset.firmware, query.firmware) : undefined,
    query.group ? eq(dataset.group, query.group) : undefined,
    query.geometry ? eq(dataset.geometry, query.geometry) : undefined,
    query.unit ? eq(dataset.unit, query.unit) : undefined,
    query.from ? gte(dataset.measuredOn, query.from) : undefined,
    query.to ? lte(dataset.measuredOn, query.to) : undefined,
    quenchBetween(query),
    query.by ? eq(dataset.createdBy, query.by) : undefined,
    query.reports ? sql`${reportCount} ${sql.raw(query.reports === 'with' ? '> 0' : '= 0')}` : undefined,
    query.verdict ? sql`${lastVerdict} = ${query.verdict}` : undefined
  );
}

/** Each word of a search must stand somewhere in the dataset; capital and small letters (of ASCII) are the same. */
function mentions(word: string): SQL {
  const pattern = `%${word.replace(/[\\%_]/g, '\\$&')}%`;
  const text = sql`${dataset.name} || char(10) || ifnull(${dataset.device}, '') || char(10) || ifnull(${dataset.firmware}, '')
    || char(10) || ifnull(${dataset.group}, '') || char(10) || ifnull(${dataset.notes}, '')`;
  return sql`(${text}) like ${pattern} escape '\\'`;
}

function quenchBetween({ quenchFrom, quenchTo, quenchUnit }: DatasetQuery): SQL | undefined {
  if (quenchFrom === null && quenchTo === null) return undefined;
  const seconds = secondsIn(quenchUnit);
  if (seconds === null) {
    return and(
      eq(dataset.quenchUnit, quenchUnit),
      quenchFrom === null ? undefined : gte(dataset.quenchTime, quenchFrom),
      quenchTo === null ? undefined : lte(dataset.quenchTime, quenchTo)
    );
  }
  const time = timeInSeconds(dataset.quenchTime, dataset.quenchUnit);
  return and(
    inArray(dataset.quenchUnit, known),
    quenchFrom === null ? undefined : sql`${time} >= ${quenchFrom * seconds * (1 - SLACK)}`,
    quenchTo === null ? undefined : sql`${time} <= ${quenchTo * seconds * (1 + SLACK)}`
  );
}
