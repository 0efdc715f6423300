import type { Database } from '../../db/client';
import { claimDelivery, type ClaimedDelivery } from './claim-delivery';
import { gatherDeliveries } from './gather-deliveries';
import type { WebhookSettings } from './make-webhook';
import { openSecret } from './open-secret';
import { sendMessage, type Sent } from './send-message';
import { settleDelivery } from './settle-delivery';
import { signMessage } from './sign-message';

/** Messages under way at a time: one slow receiver holds up none of the others. */
const AT_ONCE = 8;

/**
 * Gathers what happened and sends all that is due, several webhooks at a time, each in order.
 *
 * @param stopped asked before each message
 * @param onRest told of a webhook that was put to rest
 * @returns how many attempts were made
 */
export async function deliverOnce(
  db: Database,
  { serverSecret, allowInner }: WebhookSettings,
  stopped: () => boolean = () => false,
  clock: () => number = Date.now,
  onRest: (webhookId: string) => void = () => {}
): Promise<number> {
  gatherDeliveries(db, clock());
  let attempts = 0;
  const worker = async () => {
    while (!stopped()) {
      const claimed = claimDelivery(db, clock());
      if (!claimed) return;
      attempts += 1;
      const sent = await attempt(claimed);
      if (stopped()) return;
      if (settleDelivery(db, claimed, sent, clock())) onRest(claimed.webhookId);
    }
  };
  const attempt = ({ id, webhookId, body, url, sealedSecret }: ClaimedDelivery): Promise<Sent> | Sent => {
    const secret = openSecret(sealedSecret, webhookId, serverSecret);
    if (secret === null) {
      const trouble = 'Its secret does not open: the key of the server (AUTH_SECRET) is another one now.';
      return { ok: false, answered: null, trouble };
    }
    return sendMessage(url, signMessage(secret, id, clock(), body), body, { allowInner });
  };
  await Promise.all(Array.from({ length: AT_ONCE }, worker));
  return attempts;
}
