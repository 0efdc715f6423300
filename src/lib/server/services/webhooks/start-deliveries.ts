import type { Database } from '../../db/client';
import { log } from '../../log';
import { stackOf } from '../../running/stack-of';
import { deliverOnce } from './deliver-once';
import { mailRested } from './mail-rested';
import type { WebhookSettings } from './make-webhook';
import { purgeDeliveries } from './purge-deliveries';

/** Milliseconds between two looks at what happened; what another process wrote is found by it too. */
const LOOK = 1000;
const HOUR = 3_600_000;

/**
 * Starts sending messages of webhooks in this process. What a server that is gone had not sent, or had not noted as
 * sent, is taken up again.
 *
 * @param origin address of the application, for links in mail
 * @returns ends it; the database may be closed as soon as that returns
 */
export function startDeliveries(db: Database, settings: WebhookSettings, origin: string): () => void {
  let stopped = false;
  let busy = false;
  let purged = 0;
  const look = async () => {
    if (busy || stopped) return;
    busy = true;
    try {
      await deliverOnce(
        db,
        settings,
        () => stopped,
        Date.now,
        (id) => void mailRested(db, id, origin)
      );
      if (!stopped && Math.abs(Date.now() - purged) > HOUR) {
        purgeDeliveries(db);
        purged = Date.now();
      }
    } catch (error) {
      // Locked or full: looked at again in a second.
      log('error', 'webhooks were not sent', { why: stackOf(error) });
    } finally {
      busy = false;
    }
  };
  const timer = setInterval(() => void look(), LOOK).unref();
  return () => {
    stopped = true;
    clearInterval(timer);
  };
}
