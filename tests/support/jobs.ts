import type { Database } from '$lib/server/db/client';
import { job } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { enqueueJobs } from '$lib/server/services/jobs/enqueue-jobs';
import { eq } from 'drizzle-orm';
import { resolve } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { makeDataset } from './saved-reports';

export const ODD_WORKER = resolve('tests/support/odd-worker.mjs');

/** A job of a dataset of its own; `seed` says how the odd worker goes wrong. */
export function makeJob(db: Database, actor: Actor, seed = 1, now = Date.now()): string {
  const datasetId = makeDataset(db, actor.teamId, actor.personId, { trials: 12 });
  const asked = enqueueJobs(db, actor, [datasetId], { seed, resamples: 19 }, now);
  if (!asked.ok) throw new Error(asked.reason);
  return asked.jobs[0].id;
}

export function jobOf(db: Database, id: string): typeof job.$inferSelect {
  return db.select().from(job).where(eq(job.id, id)).get()!;
}

/** Waits until something holds, and says what was there instead when it never does. */
export async function until<T>(
  look: () => T | Promise<T>,
  holds: (value: T) => boolean,
  patience = 20_000
): Promise<T> {
  for (const start = Date.now(); ; await sleep(20)) {
    const value = await look();
    if (holds(value)) return value;
    if (Date.now() - start > patience) throw new Error(`Still ${JSON.stringify(value)}`);
  }
}

/** Waits for a job to reach a status. */
export function untilStatus(db: Database, id: string, status: string): Promise<typeof job.$inferSelect> {
  return until(
    () => jobOf(db, id),
    (row) => row.status === status
  );
}
