import { and, eq, isNull, type SQL } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, link, report, sweep } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

/** What a link opens: one report, or one sweep, by its id. */
export type Opens = { report: string } | { sweep: string };

export type Linkable = { ok: true; document: string } | { ok: false; reason: 'unknown' | 'not-allowed' };

/** A report or sweep that the actor may make, list and revoke links of; another team's is as unknown as one never made. */
export function linkable(db: Pick<Database, 'select'>, actor: Actor, opens: Opens): Linkable {
  const find = 'sweep' in opens ? findSweep : findReport;
  const id = 'sweep' in opens ? opens.sweep : opens.report;
  const found = find(db, actor, 'link', id);
  if (found) return { ok: true, document: found.document };
  return { ok: false, reason: find(db, actor, 'see', id) ? 'not-allowed' : 'unknown' };
}

/** Links of that report or sweep. */
export const linksOf = (opens: Opens): SQL =>
  'sweep' in opens ? eq(link.sweepId, opens.sweep) : eq(link.reportId, opens.report);

function findReport(db: Pick<Database, 'select'>, actor: Actor, action: 'see' | 'link', id: string) {
  return db
    .select({ document: report.document })
    .from(report)
    .innerJoin(dataset, eq(dataset.id, report.datasetId))
    .where(
      and(
        eq(report.id, id),
        isNull(report.deletedAt),
        isNull(dataset.deletedAt),
        mayWhere(actor, action, report.teamId, report.createdBy)
      )
    )
    .get();
}

function findSweep(db: Pick<Database, 'select'>, actor: Actor, action: 'see' | 'link', id: string) {
  const may = mayWhere(actor, action, sweep.teamId, sweep.createdBy);
  return db
    .select({ document: sweep.document })
    .from(sweep)
    .where(and(eq(sweep.id, id), isNull(sweep.deletedAt), may))
    .get();
}
