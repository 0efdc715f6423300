import { and, lte, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, originalFile, report, siteMap, sweep } from '../../db/schema';
import { recordEvent } from '../events/record-event';
import { KEPT_ASIDE } from './kept-aside';

/** How long a file waits whose upload was never finished: a day. */
const UNFINISHED = 24 * 60 * 60 * 1000;

/**
 * Removes for good what was put aside 30 days ago: datasets with all their reports; reports, sweeps and
 * maps of sites by themselves; and then files from which no dataset or map of sites is left. Called at start and once a day.
 *
 * @returns how many of each went
 */
export function purgeAside(
  db: Database,
  now = Date.now()
): { datasets: number; reports: number; files: number } {
  return db.transaction(
    (tx) => {
      const old = now - KEPT_ASIDE;
      const reports = tx
        .delete(report)
        .where(lte(report.deletedAt, old))
        .returning({ id: report.id, teamId: report.teamId })
        .all();
      const sweeps = tx
        .delete(sweep)
        .where(lte(sweep.deletedAt, old))
        .returning({ id: sweep.id, teamId: sweep.teamId, name: sweep.name })
        .all();
      const maps = tx
        .delete(siteMap)
        .where(lte(siteMap.deletedAt, old))
        .returning({ id: siteMap.id, teamId: siteMap.teamId, name: siteMap.name })
        .all();
      const datasets = tx
        .delete(dataset)
        .where(lte(dataset.deletedAt, old))
        .returning({ id: dataset.id, teamId: dataset.teamId, name: dataset.name })
        .all();
      // A file comes before its datasets, while a person looks at what was read in it.
      const files = tx
        .delete(originalFile)
        .where(
          and(
            lte(originalFile.createdAt, now - UNFINISHED),
            sql`not exists (select 1 from dataset d where d.file_id = ${originalFile.id})
              and not exists (select 1 from site_map s where s.file_id = ${originalFile.id})`
          )
        )
        .run().changes;
      for (const { id, teamId } of reports)
        recordEvent(tx, { action: 'report.purge', teamId, thing: id }, now);
      for (const { id, teamId, name } of sweeps)
        recordEvent(tx, { action: 'sweep.purge', teamId, thing: id, detail: { name } }, now);
      for (const { id, teamId, name } of maps)
        recordEvent(tx, { action: 'site-map.purge', teamId, thing: id, detail: { name } }, now);
      for (const { id, teamId, name } of datasets)
        recordEvent(tx, { action: 'dataset.purge', teamId, thing: id, detail: { name } }, now);
      return { datasets: datasets.length, reports: reports.length, files };
    },
    { behavior: 'immediate' }
  );
}
