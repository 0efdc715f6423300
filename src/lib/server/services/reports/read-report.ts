import { readDocument, type ReadDocument } from '$lib/model/read-document';
import { and, eq } from 'drizzle-orm';
import { createHash } from 'node:crypto';
import type { Database } from '../../db/client';
import { report } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { findReport, type SavedReport } from './find-report';

export type ReadReport =
  | { ok: true; report: SavedReport; document: ReadDocument }
  /** No such report, or none of this team, or put aside. */
  | { ok: false; reason: 'unknown' };

/**
 * One report of the actor's team. Its document is checked when read: one that does not fit the schema, or no longer
 * has its sha256, comes with the reason in words; the stored bytes come in any case.
 */
export function readReport(db: Pick<Database, 'select'>, actor: Actor, id: string): ReadReport {
  const found = findReport(db, and(eq(report.id, id), mayWhere(actor, 'see', report.teamId)));
  return found ? { ok: true, report: found, document: checked(found) } : { ok: false, reason: 'unknown' };
}

function checked({ text, sha256 }: SavedReport): ReadDocument {
  // The database refuses to change a document, but a damaged disk or a hand-made restore does not ask it.
  if (createHash('sha256').update(text).digest('hex') !== sha256)
    return { ok: false, problem: 'its bytes no longer have the sha256 that was noted when it was made' };
  return readDocument(text);
}
