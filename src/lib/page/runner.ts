import type { CountData, DiagnoseOptions, Diagnosis, OnProgress } from '$lib/stats/types';
import type { DiagnoseAnswer, DiagnoseRequest } from './messages';

export type RunResult =
  | { ok: true; diagnosis: Diagnosis }
  | { ok: false; reason: 'cancelled' }
  | { ok: false; reason: 'refused' | 'failed'; message: string };

export interface Run {
  result: Promise<RunResult>;
  /** Ends the worker at once; `result` then says `cancelled`. */
  cancel: () => void;
}

/** Starts one diagnosis in a worker of its own. */
export function startRun(data: CountData, options: DiagnoseOptions, onProgress: OnProgress): Run {
  const worker = new Worker(new URL('./diagnose.worker.ts', import.meta.url), { type: 'module' });
  let settle: (result: RunResult) => void;
  const result = new Promise<RunResult>((resolve) => {
    settle = (value) => {
      worker.terminate();
      resolve(value);
    };
  });
  worker.onmessage = ({ data: answer }: MessageEvent<DiagnoseAnswer>) => {
    if (answer.kind === 'progress') onProgress(answer.progress);
    else if (answer.kind === 'done') settle({ ok: true, diagnosis: answer.diagnosis });
    else if (answer.kind === 'refused') settle({ ok: false, reason: 'refused', message: answer.reason });
    else settle({ ok: false, reason: 'failed', message: answer.message });
  };
  worker.onerror = (event) =>
    settle({ ok: false, reason: 'failed', message: event.message || 'The engine could not be loaded.' });
  const request: DiagnoseRequest = { data, options };
  worker.postMessage(request);
  return { result, cancel: () => settle({ ok: false, reason: 'cancelled' }) };
}
