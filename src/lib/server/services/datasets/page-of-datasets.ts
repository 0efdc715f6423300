import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { onePage, type Paged } from '../paging/one-page';

export interface AskedDatasets {
  limit: number;
  after?: string;
  device?: string;
  firmware?: string;
  group?: string;
  digest?: string;
}

const columns = {
  id: dataset.id,
  name: dataset.name,
  kind: dataset.kind,
  digest: dataset.digest,
  shots: dataset.shots,
  mean: dataset.mean,
  largest: dataset.largest,
  device: dataset.device,
  firmware: dataset.firmware,
  group: dataset.group,
  trials: dataset.trials,
  createdAt: dataset.createdAt
};

export type DatasetEntry = Pick<typeof dataset.$inferSelect, keyof typeof columns>;

/** The team's datasets page by page for a script, newest first; not those put aside. */
export function pageOfDatasets(db: Database, actor: Actor, asked: AskedDatasets): Paged<DatasetEntry> {
  const mine = and(
    mayWhere(actor, 'see', dataset.teamId),
    isNull(dataset.deletedAt),
    asked.device === undefined ? undefined : eq(dataset.device, asked.device),
    asked.firmware === undefined ? undefined : eq(dataset.firmware, asked.firmware),
    asked.group === undefined ? undefined : eq(dataset.group, asked.group),
    asked.digest === undefined ? undefined : eq(dataset.digest, asked.digest)
  );
  return onePage({ at: dataset.createdAt, id: dataset.id }, asked, (where, order, limit) => {
    // Ids by the index first, as in listDatasets: a sort must not carry long rows along.
    const ids = db
      .select({ id: dataset.id })
      .from(dataset)
      .where(and(mine, where))
      .orderBy(...order)
      .limit(limit)
      .all()
      .map(({ id }) => id);
    return db
      .select(columns)
      .from(dataset)
      .where(inArray(dataset.id, ids))
      .orderBy(...order)
      .all();
  });
}
