import type { Database } from '../db/client';
import { currentRunner, setCurrentRunner } from './current-runner';
import type { SaveReport } from './end-job';
import { makeRunner, type RunnerSettings } from './make-runner';

/** Starts running jobs in this process; what a server that is gone left behind is taken up again. */
export function startRunner(db: Database, saveReport: SaveReport, settings?: RunnerSettings): void {
  void stopRunner();
  setCurrentRunner(makeRunner(db, saveReport, settings));
}

/** Gives running jobs back to the queue. The database may be closed as soon as this returns; threads end soon after. */
export function stopRunner(): Promise<void> {
  const runner = currentRunner();
  setCurrentRunner(undefined);
  return runner?.stop() ?? Promise.resolve();
}
