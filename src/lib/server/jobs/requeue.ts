import { and, eq, ne, sql } from 'drizzle-orm';
import type { Database } from '../db/client';
import { job } from '../db/schema';
import { recordFailure } from './end-job';
import { isGone } from './runner-name';

/** A job that was begun this often without an end is given up: it may be what ends the server. */
const MOST_ATTEMPTS = 3;

const GIVEN_UP =
  'The server ended three times while this diagnosis ran, so it was given up. ' +
  'It may need more memory than the server has: ask for it again with fewer shots, or run it on the command line.';

const waitsAgain = { status: 'queued', runner: null, heartbeatAt: null, share: 0, step: null } as const;

/**
 * Gives jobs whose runner is gone back to the queue, or gives them up after three attempts. At start, and now and then
 * for those of another process.
 *
 * @returns the jobs that changed
 */
export function requeueAbandoned(
  db: Database,
  runner: string,
  now = Date.now()
): { id: string; teamId: string }[] {
  const left = db
    .select()
    .from(job)
    .where(and(eq(job.status, 'running'), ne(sql`ifnull(${job.runner}, '')`, runner)))
    .all()
    .filter((row) => isGone(row.runner, row.heartbeatAt, now));
  return left.filter((row) =>
    db.transaction(
      (tx) => {
        const givenUp = row.attempts >= MOST_ATTEMPTS;
        const { changes } = tx
          .update(job)
          .set(givenUp ? { status: 'failed', step: null, reason: GIVEN_UP, endedAt: now } : waitsAgain)
          .where(
            and(
              eq(job.id, row.id),
              eq(job.status, 'running'),
              sql`${job.runner} is ${row.runner} and ${job.heartbeatAt} is ${row.heartbeatAt}`
            )
          )
          .run();
        if (changes > 0 && givenUp) recordFailure(tx, row, now);
        return changes > 0;
      },
      { behavior: 'immediate' }
    )
  );
}

/** Gives all jobs of a runner that stops in good order back to the queue; that is no attempt. */
export function requeueOwn(db: Database, runner: string): void {
  db.update(job)
    .set({ ...waitsAgain, attempts: sql`max(0, ${job.attempts} - 1)` })
    .where(and(eq(job.status, 'running'), eq(job.runner, runner)))
    .run();
}
