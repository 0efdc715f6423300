import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, person, report } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { onePage, type Paged } from '../paging/one-page';

export interface ReportEntryRow {
  id: string;
  number: number;
  dataset: { id: string; name: string };
  verdict: typeof report.$inferSelect.verdict;
  engineVersion: string;
  by: string | null;
  createdAt: number;
}

/** The team's reports page by page for a script, newest first; not those put aside, nor those of such datasets. */
export function pageOfReports(
  db: Database,
  actor: Actor,
  asked: { limit: number; after?: string; dataset?: string }
): Paged<ReportEntryRow> {
  const mine = and(
    mayWhere(actor, 'see', report.teamId),
    isNull(report.deletedAt),
    isNull(dataset.deletedAt),
    asked.dataset === undefined ? undefined : eq(report.datasetId, asked.dataset)
  );
  return onePage({ at: report.createdAt, id: report.id }, asked, (where, order, limit) => {
    // Ids first and lines afterwards: documents are long, and a sort must not carry them along.
    const ids = db
      .select({ id: report.id })
      .from(report)
      .innerJoin(dataset, eq(dataset.id, report.datasetId))
      .where(and(mine, where))
      .orderBy(...order)
      .limit(limit)
      .all()
      .map(({ id }) => id);
    return db
      .select({
        id: report.id,
        number: report.number,
        dataset: { id: dataset.id, name: dataset.name },
        verdict: report.verdict,
        engineVersion: report.engineVersion,
        by: person.name,
        createdAt: report.createdAt
      })
      .from(report)
      .innerJoin(dataset, eq(dataset.id, report.datasetId))
      .leftJoin(person, eq(person.id, report.createdBy))
      .where(inArray(report.id, ids))
      .orderBy(...order)
      .all();
  });
}
