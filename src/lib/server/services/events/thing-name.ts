import { eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, job, link, person, report, siteMap, sweep } from '../../db/schema';

interface NamedBy {
  action: string;
  thing: string | null;
  linkId: string | null;
  detail: Record<string, unknown>;
}

/** What the thing of an event is called now; for what is gone, the name its event kept; null when nothing is known. */
export function thingName(
  db: Database,
  teamId: string,
  { action, thing, linkId, detail }: NamedBy
): string | null {
  if (thing === null) return null;
  const kept = typeof detail.name === 'string' ? detail.name : null;
  switch (action.split('.')[0]) {
    case 'dataset':
      return datasetName(db, teamId, thing) ?? (kept ? `“${kept}”` : null);
    case 'report':
      return reportName(db, teamId, thing);
    case 'sweep':
      return sweepName(db, teamId, thing) ?? (kept ? `the sweep “${kept}”` : null);
    case 'site-map':
      return siteMapName(db, teamId, thing) ?? (kept ? `the map of sites “${kept}”` : null);
    case 'link': {
      const name = reportName(db, teamId, thing) ?? sweepName(db, teamId, thing) ?? 'a report';
      const found = linkId === null ? undefined : db.select().from(link).where(eq(link.id, linkId)).get();
      return found?.teamId === teamId ? `the link “${found.label}” to ${name}` : `a link to ${name}`;
    }
    case 'remark':
      return reportName(db, teamId, thing);
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

function sweepName(db: Database, teamId: string, id: string): string | null {
  const found = db
    .select({ name: sweep.name })
    .from(sweep)
    .where(sql`${sweep.id} = ${id} and ${sweep.teamId} = ${teamId}`)
    .get();
  return found ? `the sweep “${found.name}”` : null;
}

function siteMapName(db: Database, teamId: string, id: string): string | null {
  const found = db
    .select({ name: siteMap.name })
    .from(siteMap)
    .where(sql`${siteMap.id} = ${id} and ${siteMap.teamId} = ${teamId}`)
    .get();
  return found ? `the map of sites “${found.name}”` : null;
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
