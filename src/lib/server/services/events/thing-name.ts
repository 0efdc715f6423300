import { eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, job, link, person, remark, report } from '../../db/schema';

/** What the thing of an event is called now; for what is gone, the name its event kept; null when nothing is known. */
export function thingName(
  db: Database,
  teamId: string,
  { action, thing, detail }: { action: string; thing: string | null; detail: Record<string, unknown> }
): string | null {
  if (thing === null) return null;
  const kept = typeof detail.name === 'string' ? detail.name : null;
  switch (action.split('.')[0]) {
    case 'dataset':
      return datasetName(db, teamId, thing) ?? (kept ? `“${kept}”` : null);
    case 'report':
      return reportName(db, teamId, thing);
    case 'link': {
      const found = db.select().from(link).where(eq(link.id, thing)).get();
      if (!found || found.teamId !== teamId) return null;
      return `the link “${found.label}” to ${reportName(db, teamId, found.reportId) ?? 'a report'}`;
    }
    case 'remark': {
      const found = db.select({ reportId: remark.reportId }).from(remark).where(eq(remark.id, thing)).get();
      return reportName(db, teamId, found?.reportId ?? thing);
    }
    case 'job': {
      const found = db
        .select({ datasetId: job.datasetId, teamId: job.teamId })
        .from(job)
        .where(eq(job.id, thing))
        .get();
      const name = datasetName(db, teamId, found?.datasetId ?? thing);
      return name ? `the diagnosis of ${name}` : null;
    }
    case 'member':
      return db.select({ name: person.name }).from(person).where(eq(person.id, thing)).get()?.name ?? null;
    default:
      return null;
  }
}

function datasetName(db: Database, teamId: string, id: string): string | null {
  const found = db
    .select({ name: dataset.name })
    .from(dataset)
    .where(sql`${dataset.id} = ${id} and ${dataset.teamId} = ${teamId}`)
    .get();
  return found ? `“${found.name}”` : null;
}

function reportName(db: Database, teamId: string, id: string): string | null {
  const found = db
    .select({ number: report.number, name: dataset.name })
    .from(report)
    .innerJoin(dataset, eq(dataset.id, report.datasetId))
    .where(sql`${report.id} = ${id} and ${report.teamId} = ${teamId}`)
    .get();
  return found ? `report ${found.number} of “${found.name}”` : null;
}
