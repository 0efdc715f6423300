import { outsideRequest } from '../running/seen-request';
import type { Runner } from './make-runner';

/*
 * Apart from startRunner, so that who only queues a job (the command line, a test) loads no threads.
 * On globalThis, since a development server loads this file anew at every change.
 */
const holder = globalThis as { [runner: symbol]: Runner | undefined };
const place = Symbol.for('severalty.runner');

/** The runner of this process, if it has one. */
export const currentRunner = (): Runner | undefined => holder[place];

export function setCurrentRunner(runner: Runner | undefined): void {
  holder[place] = runner;
}

/** A job was queued. */
export function wakeRunner(): void {
  outsideRequest(() => holder[place]?.wake());
}

/** A job was cancelled: its row says so already, and this ends its thread. */
export function abortJob(jobId: string): void {
  holder[place]?.abort(jobId);
}
