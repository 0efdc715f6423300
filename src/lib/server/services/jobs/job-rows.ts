import { and, eq, isNull } from 'drizzle-orm';
import type { JobRow } from '../../../model/team/jobs/job-row';
import type { Database } from '../../db/client';
import { dataset, job, person, report } from '../../db/schema';

/** Jobs with the names that people see: of the dataset, of who asked, of the report unless it is put aside. */
export function jobRows(db: Database) {
  return db
    .select({
      id: job.id,
      status: job.status,
      dataset: { id: dataset.id, name: dataset.name },
      share: job.share,
      step: job.step,
      reason: job.reason,
      report: { id: report.id, number: report.number },
      by: person.name,
      createdAt: job.createdAt,
      startedAt: job.startedAt,
      endedAt: job.endedAt
    })
    .from(job)
    .innerJoin(dataset, eq(dataset.id, job.datasetId))
    .leftJoin(person, eq(person.id, job.createdBy))
    .leftJoin(report, and(eq(report.id, job.reportId), isNull(report.deletedAt)))
    .$dynamic();
}

type Selected = ReturnType<ReturnType<typeof jobRows>['all']>[number];

export function toJobRow({ startedAt, ...row }: Selected, now: number): JobRow {
  return {
    ...row,
    step: row.step as JobRow['step'],
    elapsed: row.status === 'running' && startedAt !== null ? Math.max(0, now - startedAt) : null
  };
}
