import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, report } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

export type LinkableReport =
  { ok: true; report: { document: string } } | { ok: false; reason: 'unknown' | 'not-allowed' };

/** A report that the actor may make, list and revoke links of; one of another team is as unknown as one never made. */
export function linkableReport(db: Pick<Database, 'select'>, actor: Actor, reportId: string): LinkableReport {
  const find = (action: 'see' | 'link') =>
    db
      .select({ document: report.document })
      .from(report)
      .innerJoin(dataset, eq(dataset.id, report.datasetId))
      .where(
        and(
          eq(report.id, reportId),
          isNull(report.deletedAt),
          isNull(dataset.deletedAt),
          mayWhere(actor, action, report.teamId, report.createdBy)
        )
      )
      .get();
  const found = find('link');
  if (found) return { ok: true, report: found };
  return { ok: false, reason: find('see') ? 'not-allowed' : 'unknown' };
}
