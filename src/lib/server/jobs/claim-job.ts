import { and, asc, count, eq, min, sql } from 'drizzle-orm';
import type { Database } from '../db/client';
import { dataset, job } from '../db/schema';

export interface ClaimedJob {
  id: string;
  teamId: string;
  /** DiagnoseOptions as JSON. */
  options: string;
  /** CountData as JSON; null when the dataset was put aside meanwhile. */
  counts: string | null;
}

/** When each team was last given a thread, as a number that grows. */
export type Turns = Map<string, number>;

/**
 * Takes the next job for a runner; null when none waits. Fair between teams: the team with the fewest jobs running
 * comes first, then the one whose last turn is longest ago, so a team with 500 jobs in the queue does not hold up
 * another's one. Within a team the oldest comes first.
 *
 * Two processes cannot take the same job: it is taken by one write that asks for `queued`.
 */
export function claimJob(db: Database, runner: string, turns: Turns, now = Date.now()): ClaimedJob | null {
  return db.transaction(
    (tx) => {
      const waiting = tx
        .select({ teamId: job.teamId, oldest: min(job.createdAt) })
        .from(job)
        .where(eq(job.status, 'queued'))
        .groupBy(job.teamId)
        .all();
      if (waiting.length === 0) return null;
      const busy = new Map(
        tx
          .select({ teamId: job.teamId, jobs: count() })
          .from(job)
          .where(eq(job.status, 'running'))
          .groupBy(job.teamId)
          .all()
          .map(({ teamId, jobs }) => [teamId, jobs])
      );
      const rank = ({ teamId, oldest }: (typeof waiting)[number]) => [
        busy.get(teamId) ?? 0,
        turns.get(teamId) ?? 0,
        oldest ?? 0
      ];
      const next = waiting.reduce((best, other) => (before(rank(other), rank(best)) ? other : best));
      const oldest = tx
        .select({ id: job.id })
        .from(job)
        .where(and(eq(job.teamId, next.teamId), eq(job.status, 'queued')))
        .orderBy(asc(job.createdAt), sql`job.rowid`)
        .limit(1)
        .get();
      if (!oldest) return null;
      const taken = tx
        .update(job)
        .set({
          status: 'running',
          runner,
          heartbeatAt: now,
          startedAt: now,
          attempts: sql`${job.attempts} + 1`,
          share: 0,
          step: null
        })
        .where(and(eq(job.id, oldest.id), eq(job.status, 'queued')))
        .returning({ id: job.id, teamId: job.teamId, datasetId: job.datasetId, options: job.options })
        .get();
      if (!taken) return null;
      turns.set(taken.teamId, Math.max(0, ...turns.values()) + 1);
      const found = tx
        .select({ counts: dataset.counts, deletedAt: dataset.deletedAt })
        .from(dataset)
        .where(eq(dataset.id, taken.datasetId))
        .get();
      const { id, teamId, options } = taken;
      return { id, teamId, options, counts: found && found.deletedAt === null ? found.counts : null };
    },
    { behavior: 'immediate' }
  );
}

function before(a: number[], b: number[]): boolean {
  const place = a.findIndex((value, i) => value !== b[i]);
  return place >= 0 && a[place] < b[place];
}
