import { availableParallelism } from 'node:os';
import { parentPort, Worker } from 'node:worker_threads';
import type { DrawHelper } from '$lib/stats/resampling/draw-helper';
import type { DrawAnswer, FittedJob } from '$lib/stats/resampling/fitted-draws';
import { rangeAnswerer, type RangeRequest } from '$lib/stats/resampling/range-answerer';

export interface SecondThread extends DrawHelper {
  /** Ends the thread at once, whatever it is doing. */
  end(): void;
}

/**
 * A second thread for one diagnosis, started when it is first asked; undefined where there is one core.
 *
 * @param script a file that calls serveDraws() when it is not the main thread
 */
export function secondThread(script: string): SecondThread | undefined {
  if (availableParallelism() < 2) return undefined;
  let worker: Worker | null = null;
  let sent: FittedJob | null = null;
  const waiting: { resolve: (answers: DrawAnswer[]) => void; reject: (error: Error) => void }[] = [];
  let ended: Error | null = null;
  const fail = (error: Error) => {
    ended ??= error;
    waiting.splice(0).forEach(({ reject }) => reject(error));
  };
  const begin = () => {
    const thread = new Worker(script);
    // Answers come in the order of the ranges.
    thread.on('message', (answers: DrawAnswer[]) => waiting.shift()?.resolve(answers));
    thread.on('error', fail);
    thread.on('exit', () => fail(new Error('the second thread has ended')));
    return thread;
  };
  return {
    answers(job, range) {
      return new Promise((resolve, reject) => {
        if (ended !== null) return reject(ended);
        worker ??= begin();
        waiting.push({ resolve, reject });
        worker.postMessage({ job: job === sent ? null : job, range } satisfies RangeRequest);
        sent = job;
      });
    },
    end() {
      void worker?.terminate();
    }
  };
}

/** What the thread does. */
export function serveDraws(): void {
  const answer = rangeAnswerer();
  parentPort!.on('message', (request: RangeRequest) => parentPort!.postMessage(answer(request)));
}
