import type { Database } from '../../db/client';
import { log } from '../../log';
import { stackOf } from '../../running/stack-of';
import { tellWatchers, type TellingSettings } from './tell-watchers';

/** Milliseconds between two looks: a mail takes longer than that anyway. */
const LOOK = 5000;

/**
 * Starts telling people by mail in this process. Several processes on one database share the work.
 *
 * @returns ends it; the database may be closed as soon as that returns
 */
export function startWatches(db: Database, settings: TellingSettings): () => void {
  const waiting = new Map<string, number>();
  let busy = false;
  const look = async () => {
    if (busy || !db.$client.open) return;
    busy = true;
    try {
      await tellWatchers(db, settings, waiting);
    } catch (error) {
      // Locked or full: looked at again in a moment.
      log('error', 'watches were not told', { why: stackOf(error) });
    } finally {
      busy = false;
    }
  };
  const timer = setInterval(() => void look(), LOOK).unref();
  return () => clearInterval(timer);
}
