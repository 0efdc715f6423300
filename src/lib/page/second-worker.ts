import type { DrawHelper } from '$lib/stats/resampling/draw-helper';
import type { DrawAnswer, FittedJob } from '$lib/stats/resampling/fitted-draws';
import type { RangeRequest } from '$lib/stats/resampling/range-answerer';

/**
 * A worker inside a worker, for one diagnosis, started when it is first asked; undefined where there is one core. The
 * browser ends it with the worker that started it.
 */
export function secondWorker(): DrawHelper | undefined {
  if (navigator.hardwareConcurrency < 2) return undefined;
  let worker: Worker | null = null;
  let sent: FittedJob | null = null;
  const waiting: { resolve: (answers: DrawAnswer[]) => void; reject: (error: Error) => void }[] = [];
  const begin = () => {
    const inner = new Worker(new URL('./draws.worker.ts', import.meta.url), { type: 'module' });
    // Answers come in the order of the ranges.
    inner.onmessage = ({ data }: MessageEvent<DrawAnswer[]>) => waiting.shift()?.resolve(data);
    inner.onerror = (event) => {
      // Else it would go on to the page, which would take the whole diagnosis for failed.
      event.preventDefault();
      waiting.splice(0).forEach(({ reject }) => reject(new Error(event.message)));
    };
    return inner;
  };
  return {
    answers(job, range) {
      return new Promise((resolve, reject) => {
        worker ??= begin();
        waiting.push({ resolve, reject });
        worker.postMessage({ job: job === sent ? null : job, range } satisfies RangeRequest);
        sent = job;
      });
    }
  };
}
