import { diagnose } from '$lib/stats/diagnose';
import { BadInput, type Progress } from '$lib/stats/types';
import type { DiagnoseAnswer, DiagnoseRequest } from './messages';
import { secondWorker } from './second-worker';

const say = (answer: DiagnoseAnswer): void => self.postMessage(answer);

/** One diagnosis a worker; the page ends the worker to cancel it, and with it the worker inside. */
self.onmessage = async ({ data }: MessageEvent<DiagnoseRequest>) => {
  try {
    const tell = (progress: Progress) => say({ kind: 'progress', progress });
    const diagnosis = await diagnose(data.data, data.options, tell, undefined, secondWorker());
    say({ kind: 'done', diagnosis });
  } catch (error) {
    if (error instanceof BadInput) say({ kind: 'refused', reason: error.reason });
    else say({ kind: 'failed', message: error instanceof Error ? error.message : String(error) });
  }
};
