import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, originalFile } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { safeFileName } from './safe-file-name';

/** The file that a dataset came from, byte for byte. */
export function originalOfDataset(
  db: Database,
  actor: Actor,
  id: string
): { ok: true; name: string; bytes: Buffer; sha256: string } | { ok: false; reason: 'unknown' } {
  const found = db
    .select({ name: originalFile.name, bytes: originalFile.bytes, sha256: originalFile.sha256 })
    .from(dataset)
    .innerJoin(originalFile, eq(originalFile.id, dataset.fileId))
    .where(and(eq(dataset.id, id), mayWhere(actor, 'see', dataset.teamId)))
    .get();
  if (!found) return { ok: false, reason: 'unknown' };
  return { ok: true, ...found, name: safeFileName(found.name) };
}
