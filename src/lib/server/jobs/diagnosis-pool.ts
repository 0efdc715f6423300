import type { DiagnoseOptions, Diagnosis, Progress } from '$lib/stats/types';
import { MessageChannel } from 'node:worker_threads';
import { Piscina } from 'piscina';
import { log } from '../log';
import { stackOf } from '../running/stack-of';
import { sayFailure } from './say-failure';
import type { DiagnosisTask, TaskAnswer } from './task';

/** Milliseconds that an idle thread is kept for the next job. */
const IDLE = 30_000;

export type Outcome =
  | { kind: 'done'; document: Diagnosis }
  | { kind: 'failed'; reason: string }
  /** The signal was aborted. */
  | { kind: 'aborted' };

export interface DiagnosisPool {
  /** Never rejects. An abort ends the thread at once, whatever it is doing. */
  run(
    task: { job: string; counts: string; options: DiagnoseOptions },
    signal: AbortSignal,
    onProgress: (progress: Progress) => void
  ): Promise<Outcome>;
  destroy(): Promise<void>;
}

/**
 * Threads that run diagnoses, started when there is work and ended when there was none for a while.
 *
 * @param file the built worker
 * @param memory megabytes that one thread may take; beyond, that thread ends and the server lives on
 */
export function diagnosisPool(file: string, threads: number, memory: number): DiagnosisPool {
  const pool = new Piscina({
    minThreads: 0,
    maxThreads: threads,
    idleTimeout: IDLE,
    resourceLimits: { maxOldGenerationSizeMb: memory }
  });
  // A thread that fails between two jobs; without a listener it would end the server.
  pool.on('error', (error: Error) =>
    log('error', 'an idle diagnosis thread failed', { why: stackOf(error) })
  );
  return {
    async run({ job, counts, options }, signal, onProgress) {
      const { port1, port2 } = new MessageChannel();
      port1.on('message', onProgress);
      try {
        // The file is named here and not to the pool: a file that cannot be loaded then fails the job, while the pool
        // would wait for a thread that never gets ready.
        const answer = (await pool.run({ counts, options, port: port2 } satisfies DiagnosisTask, {
          filename: file,
          signal,
          transferList: [port2]
        })) as TaskAnswer;
        return answer.kind === 'done' ? answer : { kind: 'failed', reason: answer.reason };
      } catch (error) {
        if (signal.aborted) return { kind: 'aborted' };
        log('error', 'a diagnosis failed', { job, why: stackOf(error) });
        return { kind: 'failed', reason: sayFailure(error, memory) };
      } finally {
        port1.close();
      }
    },
    destroy: () => pool.destroy()
  };
}
