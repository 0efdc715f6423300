import { diagnose } from '$lib/stats/diagnose';
import { BadInput, type CountData, type Progress } from '$lib/stats/types';
import type { DiagnosisTask, TaskAnswer } from './task';

/** Milliseconds between two messages of progress: the engine could send sixteen a second, and nobody reads so fast. */
const BETWEEN = 200;

/**
 * One diagnosis in a thread of its own: the engine that the page and the command line run, so the same document to the
 * byte. Built into build-worker/ (vite.worker.config.ts), where the pool finds it.
 */
export default async function runDiagnosis({ counts, options, port }: DiagnosisTask): Promise<TaskAnswer> {
  let last = 0;
  const tell = (progress: Progress) => {
    if (Date.now() - last < BETWEEN) return;
    last = Date.now();
    port.postMessage(progress);
  };
  try {
    return { kind: 'done', document: await diagnose(JSON.parse(counts) as CountData, options, tell) };
  } catch (error) {
    if (error instanceof BadInput) return { kind: 'refused', reason: error.reason };
    throw error;
  } finally {
    port.close();
  }
}
