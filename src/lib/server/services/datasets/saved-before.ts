import { and, asc, inArray, isNull } from 'drizzle-orm';
import type { NamedDataset } from '../../../model/team/datasets/preview';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

/** Datasets named of one kind; a team with more finds them in its table. */
const MOST = 10;

/** From the same part of the same bytes, and of equal counts from another file. */
export interface SavedBefore {
  already: NamedDataset[];
  sameCounts: NamedDataset[];
}

/**
 * Which datasets of the team, not put aside, hold counts of these digests: asked once for a whole file, which may hold
 * a thousand.
 *
 * @returns what is there for one dataset of a file; read in another way, the same part gives other counts, and is new
 */
export function savedBefore(
  db: Pick<Database, 'select'>,
  actor: Actor,
  digests: string[]
): (digest: string, fileId: string, part: string | null) => SavedBefore {
  const columns = {
    id: dataset.id,
    name: dataset.name,
    digest: dataset.digest,
    fileId: dataset.fileId,
    part: dataset.part
  };
  const rows = db
    .select(columns)
    .from(dataset)
    .where(
      and(
        mayWhere(actor, 'see', dataset.teamId),
        isNull(dataset.deletedAt),
        inArray(dataset.digest, [...new Set(digests)])
      )
    )
    .orderBy(asc(dataset.createdAt), asc(dataset.id))
    .all();
  const byDigest = new Map<string, typeof rows>();
  for (const row of rows) byDigest.set(row.digest, [...(byDigest.get(row.digest) ?? []), row]);
  return (digest, fileId, part) => {
    const same = byDigest.get(digest) ?? [];
    const named = (list: typeof rows) => list.slice(0, MOST).map(({ id, name }) => ({ id, name }));
    return {
      already: named(same.filter((row) => row.fileId === fileId && row.part === part)),
      sameCounts: named(same.filter((row) => row.fileId !== fileId))
    };
  };
}
