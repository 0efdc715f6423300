import type { MessagePort } from 'node:worker_threads';
import type { DiagnoseOptions, Diagnosis } from '$lib/stats/types';

/** What a thread is given. Counts come as the text that the database holds, so that no other thread parses it. */
export interface DiagnosisTask {
  /** CountData as JSON. */
  counts: string;
  options: DiagnoseOptions;
  /** Told `Progress` now and then. */
  port: MessagePort;
}

/** What it answers; an error class would not survive the way back. */
export type TaskAnswer = { kind: 'done'; document: Diagnosis } | { kind: 'refused'; reason: string };
