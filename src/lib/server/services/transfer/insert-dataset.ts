import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { dataset, originalFile } from '../../db/schema';
import { safeFileName } from '../datasets/safe-file-name';
import { nameDevice } from '../devices/name-device';
import { recordEvent } from '../events/record-event';
import type { ReadDataset } from './read-archive';

export interface ImportContext {
  teamId: string;
  /** Who imports: told in the events, and not taken for who made it. */
  personId: string;
  /** Who made what, as text, by path. */
  madeBy: Record<string, string>;
  now: number;
}

/** Adds a dataset of an archive, and its file where the team does not have those bytes yet. */
export function insertDataset(
  tx: Pick<Database, 'select' | 'insert'>,
  { path, file, facts, original }: ReadDataset,
  { teamId, personId, madeBy, now }: ImportContext
): string {
  const { sha256, name, size } = file.original;
  const there = tx
    .select({ id: originalFile.id })
    .from(originalFile)
    .where(and(eq(originalFile.teamId, teamId), eq(originalFile.sha256, sha256)))
    .get();
  const fileId = there?.id ?? newId();
  if (!there)
    tx.insert(originalFile)
      .values({
        id: fileId,
        teamId,
        name: safeFileName(name),
        sha256,
        size,
        bytes: Buffer.from(original),
        createdAt: now
      })
      .run();
  const id = newId();
  tx.insert(dataset)
    .values({
      ...file.conditions,
      id,
      teamId,
      fileId,
      reading: JSON.stringify(file.reading),
      part: file.part,
      counts: facts.text,
      kind: facts.kind,
      digest: facts.digest,
      shots: facts.shots,
      mean: facts.mean,
      largest: facts.largest,
      createdBy: null,
      createdAt: Date.parse(file.createdAt),
      updatedAt: Date.parse(file.updatedAt)
    })
    .run();
  nameDevice(tx, { ...file.conditions, teamId, createdBy: null }, now);
  const detail = { name: file.conditions.name, madeBy: madeBy[path] ?? null };
  recordEvent(tx, { action: 'dataset.import', teamId, personId, thing: id, detail }, now);
  return id;
}
