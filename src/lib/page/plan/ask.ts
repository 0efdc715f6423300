import type { TaskAnswer, TaskRequest, Tasks } from './messages';

export interface Asked<Result> {
  /** null when it was cancelled; rejects when the worker could not be had. */
  result: Promise<Result | null>;
  cancel: () => void;
}

/** Puts one question to a worker of its own. */
export function ask<Kind extends keyof Tasks>(
  kind: Kind,
  asked: Tasks[Kind]['request'],
  onProgress: (share: number) => void = () => {}
): Asked<Tasks[Kind]['result']> {
  const worker = new Worker(new URL('./plan.worker.ts', import.meta.url), { type: 'module' });
  let cancel = () => {};
  const result = new Promise<Tasks[Kind]['result'] | null>((resolve, reject) => {
    const end = (settle: () => void) => {
      worker.terminate();
      settle();
    };
    cancel = () => end(() => resolve(null));
    worker.onmessage = ({ data }: MessageEvent<TaskAnswer>) => {
      if (data.kind === 'progress') onProgress(data.share);
      else if (data.kind === 'done') end(() => resolve(data.result as Tasks[Kind]['result']));
      else end(() => reject(new Error(data.message)));
    };
    worker.onerror = (event) => end(() => reject(new Error(event.message || 'It could not be loaded.')));
    worker.postMessage({ kind, asked } as TaskRequest);
  });
  return { result, cancel: () => cancel() };
}
