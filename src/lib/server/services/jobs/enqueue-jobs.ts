import { and, count, eq, inArray, isNull } from 'drizzle-orm';
import { optionsOfConditions } from '../../../model/team/datasets/options-of-conditions';
import { MOST_JOBS, type Hardness } from '../../../model/team/jobs/job-request';
import { defaultOptions } from '../../../stats/default-options';
import { checkOptions } from '../../../stats/input/check-options';
import { BadInput, type DiagnoseOptions } from '../../../stats/types';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { dataset, job } from '../../db/schema';
import { wakeRunner } from '../../jobs/current-runner';
import { tellJobChange } from '../../jobs/job-changes';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { scriptOf } from '../access/script-of';
import { recordEvent } from '../events/record-event';

export type Enqueued =
  | {
      ok: true;
      /** In the order of the datasets; `already`: the same diagnosis was waiting or running. */
      jobs: { id: string; datasetId: string; already: boolean }[];
    }
  /** A dataset is not the team's, is put aside, or the actor may not. */
  | { ok: false; reason: 'unknown' }
  | { ok: false; reason: 'bad-options'; why: string }
  /** More than a team may have waiting. */
  | { ok: false; reason: 'too-many'; queued: number; most: number };

/**
 * Asks for diagnoses of datasets, all or none. What is known of each experiment (trials, unit, geometry, misread rate, counts
 * kept) comes from the dataset's own conditions; `hardness` says how hard to look. A second click adds nothing: the same
 * diagnosis that still waits or runs is given instead.
 */
export function enqueueJobs(
  db: Database,
  actor: Actor,
  datasetIds: string[],
  hardness: Hardness = {},
  now = Date.now()
): Enqueued {
  const wanted = [...new Set(datasetIds)];
  const result = db.transaction(
    (tx): Enqueued => {
      const rows = tx
        .select({
          id: dataset.id,
          trials: dataset.trials,
          unit: dataset.unit,
          geometry: dataset.geometry,
          misread: dataset.misread,
          misreadUncertainty: dataset.misreadUncertainty,
          kept: dataset.kept
        })
        .from(dataset)
        .where(
          and(
            inArray(dataset.id, wanted),
            isNull(dataset.deletedAt),
            mayWhere(actor, 'diagnose', dataset.teamId)
          )
        )
        .all();
      const found = new Map(rows.map(({ id, ...conditions }) => [id, conditions]));
      const asked: { id: string; options: string }[] = [];
      for (const id of wanted) {
        const conditions = found.get(id);
        if (!conditions) return { ok: false, reason: 'unknown' };
        const options = { ...defaultOptions, ...given(hardness), ...optionsOfConditions(conditions) };
        const why = trouble(options);
        if (why !== null) return { ok: false, reason: 'bad-options', why };
        asked.push({ id, options: JSON.stringify(options) });
      }
      const waiting = tx
        .select({ id: job.id, datasetId: job.datasetId, options: job.options })
        .from(job)
        .where(and(inArray(job.datasetId, wanted), inArray(job.status, ['queued', 'running'])))
        .all();
      const jobs = asked.map(({ id, options }) => {
        const same = waiting.find((other) => other.datasetId === id && other.options === options);
        return { id: same?.id ?? newId(), datasetId: id, already: same !== undefined, options };
      });
      const fresh = jobs.filter(({ already }) => !already);
      const queued = queuedOf(tx, actor.teamId);
      if (queued + fresh.length > MOST_JOBS)
        return { ok: false, reason: 'too-many', queued, most: MOST_JOBS };
      const by = { teamId: actor.teamId, createdBy: actor.personId };
      for (const { id, datasetId, options } of fresh) {
        tx.insert(job)
          .values({ id, datasetId, options, ...by, status: 'queued', createdAt: now })
          .run();
        recordEvent(
          tx,
          {
            action: 'job.queue',
            teamId: by.teamId,
            personId: by.createdBy,
            thing: id,
            detail: { dataset: datasetId, ...scriptOf(actor) }
          },
          now
        );
      }
      return {
        ok: true,
        jobs: jobs.map(({ id, datasetId, already }) => ({ id, datasetId, already }))
      };
    },
    { behavior: 'immediate' }
  );
  if (result.ok) {
    for (const { id, already } of result.jobs) if (!already) tellJobChange(actor.teamId, id);
    wakeRunner();
  }
  return result;
}

function queuedOf(db: Pick<Database, 'select'>, teamId: string): number {
  const where = and(eq(job.teamId, teamId), eq(job.status, 'queued'));
  return db.select({ jobs: count() }).from(job).where(where).get()?.jobs ?? 0;
}

/** What was said, without what was left out. */
function given(hardness: Hardness): Partial<DiagnoseOptions> {
  return Object.fromEntries(Object.entries(hardness).filter(([, value]) => value !== undefined));
}

function trouble(options: DiagnoseOptions): string | null {
  try {
    checkOptions(options);
    return null;
  } catch (error) {
    if (error instanceof BadInput) return error.reason;
    throw error;
  }
}
