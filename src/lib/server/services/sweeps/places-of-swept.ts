import { and, asc, inArray, isNull, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import type { FrozenSwept } from './read-sweep';

/**
 * Where the datasets of a sweep are now: id by the id that the sweep names. A sweep that came in an archive names ids
 * that its datasets had elsewhere, so those are found by digest and name; one that was put aside has no place.
 */
export function placesOfSwept(
  db: Pick<Database, 'select'>,
  actor: Actor,
  swept: readonly FrozenSwept[]
): Record<string, string> {
  const mine = and(mayWhere(actor, 'see', dataset.teamId), isNull(dataset.deletedAt));
  const columns = { id: dataset.id, name: dataset.name, digest: dataset.digest };
  const byId = db
    .select(columns)
    .from(dataset)
    .where(
      and(
        mine,
        inArray(
          dataset.id,
          swept.map(({ id }) => id)
        )
      )
    )
    .all();
  const here = new Set(byId.map(({ id }) => id));
  const others = swept.filter(({ id }) => !here.has(id));
  const alike = others.length === 0 ? [] : ofDigests(others.map(({ digest }) => digest));
  const found = others.flatMap(({ id, name, digest }) => {
    const one = alike.find((row) => row.name === name && row.digest === digest);
    return one ? [[id, one.id] as const] : [];
  });
  return Object.fromEntries([...byId.map(({ id }) => [id, id] as const), ...found]);

  /** The first saved first: of two alike the older is the one that came with the sweep. */
  function ofDigests(digests: string[]) {
    return db
      .select(columns)
      .from(dataset)
      .where(and(mine, inArray(dataset.digest, digests)))
      .orderBy(asc(dataset.createdAt), asc(sql`"dataset".rowid`))
      .all();
  }
}
