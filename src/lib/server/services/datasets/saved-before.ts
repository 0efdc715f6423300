import { and, eq, isNull, ne } from 'drizzle-orm';
import type { NamedDataset } from '../../../model/team/datasets/preview';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

/** Datasets of the team, not put aside, that came from the same part of the same bytes, and others of equal counts. */
export function savedBefore(
  db: Pick<Database, 'select'>,
  actor: Actor,
  fileId: string,
  part: string | null,
  digest: string
): { already: NamedDataset[]; sameCounts: NamedDataset[] } {
  const named = { id: dataset.id, name: dataset.name };
  const here = and(
    mayWhere(actor, 'see', dataset.teamId),
    isNull(dataset.deletedAt),
    eq(dataset.digest, digest)
  );
  const samePart = part === null ? isNull(dataset.part) : eq(dataset.part, part);
  return {
    // Read in another way, the same part gives other counts, and is another dataset.
    already: db
      .select(named)
      .from(dataset)
      .where(and(here, eq(dataset.fileId, fileId), samePart))
      .limit(10)
      .all(),
    sameCounts: db
      .select(named)
      .from(dataset)
      .where(and(here, ne(dataset.fileId, fileId)))
      .limit(10)
      .all()
  };
}
