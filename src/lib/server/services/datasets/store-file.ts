import { and, eq } from 'drizzle-orm';
import { createHash } from 'node:crypto';
import { defaultMaxBytes } from '../../../formats/limits';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { originalFile } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayInTeam } from './may-in-team';
import { safeFileName } from './safe-file-name';

export type StoredFile =
  | { ok: true; file: { id: string; name: string; sha256: string; size: number }; fresh: boolean }
  | { ok: false; reason: 'not-allowed' | 'too-large' | 'empty' };

/**
 * Keeps a file byte for byte, once per team: the same bytes again give the file that is there. It has no datasets yet;
 * purgeAside (services/aside) drops it after a day when none were saved from it.
 */
export function storeFile(
  db: Database,
  actor: Actor,
  upload: { name: string; bytes: Uint8Array },
  now = Date.now()
): StoredFile {
  if (upload.bytes.length > defaultMaxBytes) return { ok: false, reason: 'too-large' };
  if (upload.bytes.length === 0) return { ok: false, reason: 'empty' };
  const sha256 = createHash('sha256').update(upload.bytes).digest('hex');
  const columns = {
    id: originalFile.id,
    name: originalFile.name,
    sha256: originalFile.sha256,
    size: originalFile.size
  };
  return db.transaction(
    (tx): StoredFile => {
      if (!mayInTeam(tx, actor, 'upload')) return { ok: false, reason: 'not-allowed' };
      const here = and(eq(originalFile.teamId, actor.teamId), eq(originalFile.sha256, sha256));
      const there = tx.select(columns).from(originalFile).where(here).get();
      if (there) return { ok: true, file: there, fresh: false };
      const file = {
        id: newId(),
        name: safeFileName(upload.name, 'counts.csv'),
        sha256,
        size: upload.bytes.length
      };
      tx.insert(originalFile)
        .values({ ...file, teamId: actor.teamId, bytes: Buffer.from(upload.bytes), createdAt: now })
        .run();
      return { ok: true, file, fresh: true };
    },
    { behavior: 'immediate' }
  );
}
