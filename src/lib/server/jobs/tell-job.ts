import { log } from '../log';
import type { Outcome } from './diagnosis-pool';

/**
 * Writes a line when a job begins, and gives what writes one when it ends: its outcome and how long its thread had it.
 * `aborted` is a job that was cancelled, or given back because the server stops.
 */
export function tellJob(job: string, team: string): (outcome: Outcome['kind']) => void {
  const begun = performance.now();
  log('info', 'job began', { job, team });
  return (outcome) =>
    log('info', 'job ended', { job, team, outcome, ms: Math.round(performance.now() - begun) });
}
