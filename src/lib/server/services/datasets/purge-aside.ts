import { lt, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, originalFile, report } from '../../db/schema';
import { recordEvent } from '../events/record-event';

const DAY = 86_400_000;
/** How long what was put aside can be brought back. */
export const KEPT_ASIDE = 30 * DAY;
/** How long a file waits whose upload was never finished. */
const UNFINISHED = DAY;

/**
 * Removes for good what was put aside more than 30 days ago: datasets with their reports, reports by themselves, and
 * then files from which no dataset is left.
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
      const gone = tx
        .delete(dataset)
        .where(lt(dataset.deletedAt, old))
        .returning({ id: dataset.id, teamId: dataset.teamId, name: dataset.name })
        .all();
      const reports = tx
        .delete(report)
        .where(lt(report.deletedAt, old))
        .returning({ id: report.id, teamId: report.teamId })
        .all();
      const files = tx
        .delete(originalFile)
        .where(
          sql`${originalFile.createdAt} < ${now - UNFINISHED} and not exists
            (select 1 from dataset d where d.file_id = ${originalFile.id})`
        )
        .run().changes;
      for (const { id, teamId, name } of gone)
        recordEvent(tx, { action: 'dataset.purge', teamId, thing: id, detail: { name } }, now);
      for (const { id, teamId } of reports)
        recordEvent(tx, { action: 'report.purge', teamId, thing: id }, now);
      return { datasets: gone.length, reports: reports.length, files };
    },
    { behavior: 'immediate' }
  );
}
