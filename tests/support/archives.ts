import { createHash } from 'node:crypto';
import { unzipSync, zipSync } from 'fflate';
import { newId } from '$lib/server/db/new-id';
import type { Database } from '$lib/server/db/client';
import { originalFile } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { countFacts } from '$lib/server/services/datasets/count-facts';
import { exportTeam } from '$lib/server/services/transfer/export-team';
import { jsonBytes } from '$lib/server/services/transfer/json-bytes';
import type { CountData } from '$lib/stats/types';
import { makeDataset } from './saved-reports';

/** A dataset whose file, digest and table numbers fit its counts, as an upload makes one. */
export function makeTrueDataset(
  db: Database,
  { teamId, personId }: Actor,
  data: CountData,
  { bytes = newId(), ...more }: Parameters<typeof makeDataset>[3] & { bytes?: string } = {}
): string {
  const file = Buffer.from(bytes);
  const sha256 = createHash('sha256').update(file).digest('hex');
  const fileId = newId();
  db.insert(originalFile)
    .values({ id: fileId, teamId, name: 'räw.csv', sha256, size: file.length, bytes: file, createdAt: 1 })
    .run();
  const { text: counts, kind, digest, shots, mean, largest } = countFacts(data);
  return makeDataset(db, teamId, personId, { fileId, counts, kind, digest, shots, mean, largest, ...more });
}

/** The bytes of a team's archive. */
export async function archiveOf(db: Database, actor: Actor, now?: number): Promise<Uint8Array> {
  const made = exportTeam(db, actor, now);
  if (!made.ok) throw new Error(made.reason);
  return new Uint8Array(await new Response(made.stream).arrayBuffer());
}

export const textsOf = (archive: Uint8Array): Record<string, string> =>
  Object.fromEntries(
    Object.entries(unzipSync(archive)).map(([path, bytes]) => [path, Buffer.from(bytes).toString('utf8')])
  );

/** An archive with some files changed (null: left out), and the manifest made to fit unless told otherwise. */
export function tampered(
  archive: Uint8Array,
  changes: Record<string, string | Uint8Array | null>,
  { fitManifest = true } = {}
): Uint8Array {
  const files: Record<string, Uint8Array> = unzipSync(archive);
  for (const [path, content] of Object.entries(changes)) {
    if (content === null) delete files[path];
    else files[path] = typeof content === 'string' ? new TextEncoder().encode(content) : content;
  }
  if (fitManifest) {
    const manifest = JSON.parse(Buffer.from(files['manifest.json']).toString()) as object;
    const listed = Object.entries(files)
      .filter(([path]) => path !== 'manifest.json')
      .map(([path, bytes]) => ({
        path,
        size: bytes.length,
        sha256: createHash('sha256').update(bytes).digest('hex')
      }));
    files['manifest.json'] = jsonBytes({ ...manifest, files: listed });
  }
  return zipSync(files);
}
