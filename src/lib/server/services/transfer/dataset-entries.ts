import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import type { DatasetFile } from '$lib/model/team/transfer/archive-schema';
import type { CountData } from '$lib/stats/types';
import type { Database } from '../../db/client';
import { dataset, originalFile, person } from '../../db/schema';
import { conditionsOf } from '../datasets/conditions-of';
import { countsCsv } from './counts-csv';
import { asText, firstMakers } from './first-makers';
import { jsonBytes } from './json-bytes';
import type { Entry } from './zip-stream';

export interface NumberedEntries {
  entries: Entry[];
  /** Path in the archive by id. */
  paths: Map<string, string>;
  /** Who made it, by path. */
  madeBy: Record<string, string>;
}

/** Five digits: files sort as they were numbered. */
export const numbered = (folder: string, i: number): string =>
  `${folder}/${String(i + 1).padStart(5, '0')}.json`;

/**
 * The datasets of a team, oldest first; of one moment in the order they were saved, so that an import, which saves in
 * this order, exports again in it.
 */
export function datasetEntries(db: Database, teamId: string): NumberedEntries {
  const rows = db
    .select({ id: dataset.id, name: person.name, email: person.email })
    .from(dataset)
    .leftJoin(person, eq(person.id, dataset.createdBy))
    .where(and(eq(dataset.teamId, teamId), isNull(dataset.deletedAt)))
    .orderBy(asc(dataset.createdAt), asc(sql`"dataset".rowid`))
    .all();
  const imported = firstMakers(db, teamId);
  const paths = new Map(rows.map(({ id }, i) => [id, numbered('datasets', i)]));
  const madeBy: Record<string, string> = {};
  const entries = rows.flatMap(({ id, name, email }, i): Entry[] => {
    const path = numbered('datasets', i);
    const by = imported.get(id) ?? (name !== null && email !== null ? asText(name, email) : undefined);
    if (by) madeBy[path] = by;
    const file = () => datasetFile(db, id);
    return [
      { path, bytes: () => jsonBytes(file()) },
      {
        path: path.replace(/json$/, 'csv'),
        bytes: () => {
          const { conditions, counts } = file();
          return new TextEncoder().encode(countsCsv(conditions, counts));
        }
      }
    ];
  });
  return { entries, paths, madeBy };
}

/** One dataset as its file; numbers of the table (shots, mean) follow from the counts and are not told. */
function datasetFile(db: Database, id: string): DatasetFile {
  const found = db
    .select({
      row: dataset,
      file: { name: originalFile.name, size: originalFile.size, sha256: originalFile.sha256 }
    })
    .from(dataset)
    .innerJoin(originalFile, eq(originalFile.id, dataset.fileId))
    .where(eq(dataset.id, id))
    .get();
  if (!found) throw new Error('A dataset was removed while it was being exported.');
  const { row, file } = found;
  return {
    format: 'severalty.dataset/1',
    conditions: conditionsOf(row),
    counts: JSON.parse(row.counts) as DatasetFile['counts'] & CountData,
    digest: row.digest,
    part: row.part,
    reading: JSON.parse(row.reading) as DatasetFile['reading'],
    original: file,
    createdAt: new Date(row.createdAt).toISOString(),
    updatedAt: new Date(row.updatedAt).toISOString()
  };
}

/** The original files of those datasets, each once, named by their sha256. */
export function originalEntries(db: Database, teamId: string): Entry[] {
  return db
    .selectDistinct({ id: originalFile.id, sha256: originalFile.sha256 })
    .from(originalFile)
    .innerJoin(dataset, eq(dataset.fileId, originalFile.id))
    .where(and(eq(originalFile.teamId, teamId), isNull(dataset.deletedAt)))
    .orderBy(asc(originalFile.sha256))
    .all()
    .map(({ id, sha256 }) => ({
      path: `originals/${sha256}`,
      bytes: () => {
        const found = db
          .select({ bytes: originalFile.bytes })
          .from(originalFile)
          .where(eq(originalFile.id, id))
          .get();
        if (!found) throw new Error('A file was removed while it was being exported.');
        return found.bytes;
      }
    }));
}
