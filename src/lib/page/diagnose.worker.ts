import { diagnose } from '$lib/stats/diagnose';
import { BadInput } from '$lib/stats/types';
import type { DiagnoseAnswer, DiagnoseRequest } from './messages';

const say = (answer: DiagnoseAnswer): void => self.postMessage(answer);

/** One diagnosis a worker; the page ends the worker to cancel it. */
self.onmessage = async ({ data }: MessageEvent<DiagnoseRequest>) => {
  try {
    const diagnosis = await diagnose(data.data, data.options, (progress) =>
      say({ kind: 'progress', progress })
    );
    say({ kind: 'done', diagnosis });
  } catch (error) {
    if (error instanceof BadInput) say({ kind: 'refused', reason: error.reason });
    else say({ kind: 'failed', message: error instanceof Error ? error.message : String(error) });
  }
};
