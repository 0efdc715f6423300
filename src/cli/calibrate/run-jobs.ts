import { Worker } from 'node:worker_threads';
import type { Outcome } from '$lib/stats/calibration/outcome';
import type { Job } from './job';

/** What a thread is sent, and answers with. */
export type ToThread = { number: number; job: Job };
export type FromThread = { number: number; outcomes: Outcome[] };

/**
 * Runs jobs on `threads` threads, each of which asks for the next when it has ended one.
 *
 * @param script the file that answers ToThread with FromThread
 * @param onDone told how many are done
 * @returns the outcomes in the order of the jobs
 */
export async function runJobs(
  script: string,
  jobs: Job[],
  threads: number,
  onDone: (done: number) => void
): Promise<Outcome[][]> {
  const results = new Array<Outcome[]>(jobs.length);
  let next = 0;
  let done = 0;
  const work = (worker: Worker) =>
    new Promise<void>((resolve, reject) => {
      const send = () => {
        if (next >= jobs.length) return resolve();
        worker.postMessage({ number: next, job: jobs[next++] } satisfies ToThread);
      };
      worker.on('message', ({ number, outcomes }: FromThread) => {
        results[number] = outcomes;
        onDone(++done);
        send();
      });
      worker.on('error', reject);
      send();
    });
  const workers = Array.from({ length: Math.min(threads, jobs.length) }, () => new Worker(script));
  try {
    await Promise.all(workers.map(work));
  } finally {
    await Promise.all(workers.map((worker) => worker.terminate()));
  }
  return results;
}
