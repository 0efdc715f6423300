import { and, desc, eq, isNotNull, isNull, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, person, report, siteMap, sweep } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { daysLeft } from './kept-aside';

export interface AsideThing {
  id: string;
  kind: 'dataset' | 'report' | 'sweep' | 'site-map';
  name: string;
  deletedAt: number;
  /** Who put it aside; null when that person is gone. */
  by: string | null;
  daysLeft: number;
  /** Whether the actor may bring it back. */
  mayRestore: boolean;
}

/**
 * What was put aside and can still be brought back, latest first. A report that went with its dataset comes back with
 * it, and is not listed by itself.
 */
export function listAside(db: Database, actor: Actor, now = Date.now()): AsideThing[] {
  const may = (table: typeof dataset | typeof report | typeof sweep | typeof siteMap) =>
    sql<number>`${mayWhere(actor, 'restore', table.teamId, table.createdBy)}`.mapWith(Boolean);
  const datasets = db
    .select({
      id: dataset.id,
      name: dataset.name,
      deletedAt: dataset.deletedAt,
      by: person.name,
      mayRestore: may(dataset)
    })
    .from(dataset)
    .leftJoin(person, eq(person.id, dataset.deletedBy))
    .where(and(mayWhere(actor, 'see', dataset.teamId), isNotNull(dataset.deletedAt)))
    .orderBy(desc(dataset.deletedAt))
    .all();
  const reports = db
    .select({
      id: report.id,
      name: sql<string>`'Report ' || ${report.number} || ' of ' || ${dataset.name}`,
      deletedAt: report.deletedAt,
      by: person.name,
      mayRestore: may(report)
    })
    .from(report)
    .innerJoin(dataset, eq(dataset.id, report.datasetId))
    .leftJoin(person, eq(person.id, report.deletedBy))
    .where(and(mayWhere(actor, 'see', report.teamId), isNotNull(report.deletedAt), isNull(dataset.deletedAt)))
    .orderBy(desc(report.deletedAt))
    .all();
  const sweeps = db
    .select({
      id: sweep.id,
      name: sql<string>`'Sweep ' || ${sweep.name}`,
      deletedAt: sweep.deletedAt,
      by: person.name,
      mayRestore: may(sweep)
    })
    .from(sweep)
    .leftJoin(person, eq(person.id, sweep.deletedBy))
    .where(and(mayWhere(actor, 'see', sweep.teamId), isNotNull(sweep.deletedAt)))
    .orderBy(desc(sweep.deletedAt))
    .all();
  const maps = db
    .select({
      id: siteMap.id,
      name: sql<string>`'Map of sites ' || ${siteMap.name}`,
      deletedAt: siteMap.deletedAt,
      by: person.name,
      mayRestore: may(siteMap)
    })
    .from(siteMap)
    .leftJoin(person, eq(person.id, siteMap.deletedBy))
    .where(and(mayWhere(actor, 'see', siteMap.teamId), isNotNull(siteMap.deletedAt)))
    .orderBy(desc(siteMap.deletedAt))
    .all();
  return [
    ...datasets.map((row) => ({ ...row, kind: 'dataset' as const })),
    ...reports.map((row) => ({ ...row, kind: 'report' as const })),
    ...sweeps.map((row) => ({ ...row, kind: 'sweep' as const })),
    ...maps.map((row) => ({ ...row, kind: 'site-map' as const }))
  ]
    .flatMap(({ deletedAt, ...row }) =>
      deletedAt === null ? [] : [{ ...row, deletedAt, daysLeft: daysLeft(deletedAt, now) }]
    )
    .filter((row) => row.daysLeft > 0)
    .sort((a, b) => b.deletedAt - a.deletedAt);
}
