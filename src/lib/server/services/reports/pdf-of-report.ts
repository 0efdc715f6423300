import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { team } from '../../db/schema';
import { mayWhere } from '../access/may-where';
import type { Actor } from '../access/actor';
import { readReport } from './read-report';

export type PdfOfReport =
  | { ok: true; bytes: Uint8Array<ArrayBuffer>; name: string }
  | { ok: false; reason: 'unknown' }
  | { ok: false; reason: 'unreadable'; problem: string };

/**
 * A report for print; the same report gives the same bytes.
 *
 * @param address where the report can be read, printed in it
 */
export async function pdfOfReport(
  db: Database,
  actor: Actor,
  id: string,
  address: string
): Promise<PdfOfReport> {
  const read = readReport(db, actor, id);
  if (!read.ok) return read;
  const { report, document } = read;
  if (!document.ok) return { ok: false, reason: 'unreadable', problem: document.problem };
  const named = db
    .select({ name: team.name })
    .from(team)
    .where(and(eq(team.id, actor.teamId), mayWhere(actor, 'see', team.id)))
    .get();
  // Its fonts are a megabyte, which a server that prints nothing need not hold.
  const { writeReport } = await import('../../pdf/write-report');
  const bytes = await writeReport({
    document: document.diagnosis,
    documentSha256: report.sha256,
    provenance: {
      madeBy: report.by,
      madeAt: new Date(report.createdAt),
      team: named?.name ?? null,
      dataset: report.conditions.name,
      conditions: report.conditions,
      link: address
    }
  });
  return { ok: true, bytes, name: `${report.conditions.name}, report ${report.number}` };
}
