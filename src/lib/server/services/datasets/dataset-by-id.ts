import { and, desc, eq, isNull } from 'drizzle-orm';
import type { OneDataset } from '../../../model/team/datasets/one-dataset';
import { toHistogram } from '../../../stats/input/to-histogram';
import type { CountData } from '../../../stats/types';
import type { Database } from '../../db/client';
import { dataset, job, originalFile, person, report } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { conditionsOf } from './conditions-of';

/** Jobs shown on the page of a dataset. */
const JOBS = 20;

/** One dataset of the team with its counts, file, reports and jobs; put aside, it is still found, and says so. */
export function datasetById(
  db: Database,
  actor: Actor,
  id: string
): { ok: true; dataset: OneDataset } | { ok: false; reason: 'unknown' } {
  const found = db
    .select({
      row: dataset,
      by: person.name,
      file: {
        id: originalFile.id,
        name: originalFile.name,
        size: originalFile.size,
        sha256: originalFile.sha256
      }
    })
    .from(dataset)
    .innerJoin(originalFile, eq(originalFile.id, dataset.fileId))
    .leftJoin(person, eq(person.id, dataset.createdBy))
    .where(and(eq(dataset.id, id), mayWhere(actor, 'see', dataset.teamId)))
    .get();
  if (!found) return { ok: false, reason: 'unknown' };
  const { row, by, file } = found;
  const counts = JSON.parse(row.counts) as CountData;
  const reports = db
    .select({
      id: report.id,
      number: report.number,
      verdict: report.verdict,
      createdAt: report.createdAt,
      by: person.name
    })
    .from(report)
    .leftJoin(person, eq(person.id, report.createdBy))
    .where(and(eq(report.datasetId, id), isNull(report.deletedAt)))
    .orderBy(desc(report.number))
    .all();
  const jobs = db
    .select({ id: job.id, status: job.status, createdAt: job.createdAt, reportId: job.reportId })
    .from(job)
    .where(eq(job.datasetId, id))
    .orderBy(desc(job.createdAt))
    .limit(JOBS)
    .all();
  return {
    ok: true,
    dataset: {
      id,
      conditions: conditionsOf(row),
      version: row.version,
      kind: row.kind,
      histogram: toHistogram(counts),
      batches: counts.kind === 'shots' && counts.batches ? new Set(counts.batches).size : null,
      part: row.part,
      digest: row.digest,
      shots: row.shots,
      mean: row.mean,
      largest: row.largest,
      file,
      by,
      createdBy: row.createdBy,
      createdAt: row.createdAt,
      updatedAt: row.updatedAt,
      deletedAt: row.deletedAt,
      reports,
      jobs
    }
  };
}
