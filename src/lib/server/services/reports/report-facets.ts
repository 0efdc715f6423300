import { and, asc, eq, isNotNull, isNull, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

/** What the table of reports can be filtered by: devices that have reports, and the name of the dataset chosen. */
export function reportFacets(
  db: Database,
  actor: Actor,
  datasetId: string
): { devices: string[]; dataset: string | null } {
  const mine = and(mayWhere(actor, 'see', dataset.teamId), isNull(dataset.deletedAt));
  const devices = db
    .selectDistinct({ device: dataset.device })
    .from(dataset)
    .where(
      and(
        mine,
        isNotNull(dataset.device),
        sql`exists (select 1 from report r where r.dataset_id = ${dataset.id} and r.deleted_at is null)`
      )
    )
    .orderBy(asc(dataset.device))
    .all()
    .flatMap(({ device }) => (device === null ? [] : [device]));
  const chosen = datasetId
    ? db
        .select({ name: dataset.name })
        .from(dataset)
        .where(and(mine, eq(dataset.id, datasetId)))
        .get()
    : undefined;
  return { devices, dataset: chosen?.name ?? null };
}
