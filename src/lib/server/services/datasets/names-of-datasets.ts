import { and, asc, inArray, isNull } from 'drizzle-orm';
import type { NamedDataset } from '../../../model/team/datasets/preview';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

/** Which of these ids are datasets that the actor may edit, with their names in alphabetical order. */
export function namesOfDatasets(db: Database, actor: Actor, ids: string[]): NamedDataset[] {
  return db
    .select({ id: dataset.id, name: dataset.name })
    .from(dataset)
    .where(and(inArray(dataset.id, ids), isNull(dataset.deletedAt), mayWhere(actor, 'edit', dataset.teamId)))
    .orderBy(asc(dataset.name))
    .all();
}
