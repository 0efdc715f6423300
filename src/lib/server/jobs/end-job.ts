import type { DiagnoseOptions, Diagnosis } from '$lib/stats/types';
import { and, eq } from 'drizzle-orm';
import type { Database } from '../db/client';
import { event, job } from '../db/schema';

/** Keeps a document as a report of its dataset; run inside the transaction that ends the job. */
export type SaveReport = (
  db: Pick<Database, 'select' | 'insert'>,
  report: {
    teamId: string;
    datasetId: string;
    document: Diagnosis;
    options: DiagnoseOptions;
    createdBy: string | null;
  },
  now?: number
) => { id: string; number: number };

/** The job is still this runner's: not cancelled, and not given to another that took this one for gone. */
const held = (id: string, runner: string) =>
  and(eq(job.id, id), eq(job.status, 'running'), eq(job.runner, runner));

/**
 * Saves the report and ends the job, both or neither: a job ends once, and has one report when it is done.
 *
 * @returns false when the job was no longer the runner's; nothing is saved then
 */
export function endDone(
  db: Database,
  { id, runner }: { id: string; runner: string },
  document: Diagnosis,
  saveReport: SaveReport,
  now = Date.now()
): boolean {
  return db.transaction(
    (tx) => {
      const mine = tx
        .update(job)
        .set({ status: 'done', share: 1, step: null, reason: null, endedAt: now })
        .where(held(id, runner))
        .returning()
        .get();
      if (!mine) return false;
      const { teamId, datasetId, createdBy } = mine;
      const options = JSON.parse(mine.options) as DiagnoseOptions;
      const report = saveReport(tx, { teamId, datasetId, document, options, createdBy }, now);
      tx.update(job).set({ reportId: report.id }).where(eq(job.id, id)).run();
      return true;
    },
    { behavior: 'immediate' }
  );
}

/** Ends a job that failed, with its reason in words; false when it was no longer the runner's. */
export function endFailed(
  db: Database,
  { id, runner }: { id: string; runner: string },
  reason: string,
  now = Date.now()
): boolean {
  return db.transaction(
    (tx) => {
      const mine = tx
        .update(job)
        .set({ status: 'failed', step: null, reason, endedAt: now })
        .where(held(id, runner))
        .returning({ teamId: job.teamId, datasetId: job.datasetId })
        .get();
      if (mine) recordFailure(tx, { id, ...mine }, now);
      return mine !== undefined;
    },
    { behavior: 'immediate' }
  );
}

/** Events are written by services, which jobs may not import. */
export function recordFailure(
  db: Pick<Database, 'insert'>,
  { id, teamId, datasetId }: { id: string; teamId: string; datasetId: string },
  now: number
): void {
  db.insert(event)
    .values({
      at: now,
      teamId,
      action: 'job.fail',
      thing: id,
      detail: JSON.stringify({ dataset: datasetId })
    })
    .run();
}
