import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { team } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { readSweep } from './read-sweep';

export type PdfOfSweep =
  | { ok: true; bytes: Uint8Array<ArrayBuffer>; name: string }
  /** No such sweep, or none of this team; or its bytes no longer have their sha256. */
  | { ok: false; reason: 'unknown' | 'damaged' };

/**
 * A sweep for print; the same sweep gives the same bytes.
 *
 * @param address where the sweep can be read, printed in it
 */
export async function pdfOfSweep(
  db: Database,
  actor: Actor,
  id: string,
  address: string | null
): Promise<PdfOfSweep> {
  const read = readSweep(db, actor, id);
  if (!read.ok) return read;
  const { sweep, document } = read;
  if (!document) return { ok: false, reason: 'damaged' };
  const named = db
    .select({ name: team.name })
    .from(team)
    .where(and(eq(team.id, actor.teamId), mayWhere(actor, 'see', team.id)))
    .get();
  // Its fonts are a megabyte, which a server that prints nothing need not hold.
  const { writeSweep } = await import('../../pdf/write-sweep');
  const bytes = await writeSweep({
    document,
    documentSha256: sweep.sha256,
    engineVersion: sweep.engineVersion,
    name: sweep.name,
    notes: sweep.notes,
    madeBy: sweep.by,
    madeAt: new Date(sweep.createdAt),
    team: named?.name ?? null,
    sources: sweep.datasets,
    link: address
  });
  return { ok: true, bytes, name: sweep.name };
}
