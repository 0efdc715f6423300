import { and, asc, desc, eq, gt, ne } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { webhook, webhookDelivery } from '../../db/schema';
import { recordEvent } from '../events/record-event';
import type { ClaimedDelivery } from './claim-delivery';
import { MOST_ATTEMPTS, retryDelay } from './retry-delay';
import type { Sent } from './send-message';

const WEEK = 7 * 86_400_000;

/**
 * Writes what came of an attempt: sent, to be tried again later, or given up after about three days. A webhook whose
 * messages all failed for a week is put to rest. Nothing is written when the claim was another's by then.
 *
 * @returns whether the webhook was put to rest by this
 */
export function settleDelivery(
  db: Database,
  claimed: ClaimedDelivery,
  sent: Sent,
  now = Date.now()
): boolean {
  const { id, webhookId, attempts, byHand } = claimed;
  const givenUp = !sent.ok && (byHand || attempts >= MOST_ATTEMPTS);
  const status = sent.ok ? 'sent' : givenUp ? 'given-up' : 'waiting';
  return db.transaction(
    (tx) => {
      const { changes } = tx
        .update(webhookDelivery)
        .set({
          status,
          dueAt: status === 'waiting' ? now + retryDelay(attempts) : null,
          answered: sent.answered,
          trouble: sent.ok ? null : sent.trouble,
          byHand: false,
          endedAt: status === 'waiting' ? null : now
        })
        .where(
          and(
            eq(webhookDelivery.id, id),
            eq(webhookDelivery.status, 'waiting'),
            eq(webhookDelivery.attempts, attempts)
          )
        )
        .run();
      if (changes === 0 || sent.ok || byHand) return false;
      if (now - failingSince(tx, webhookId, now) < WEEK) return false;
      const why = `Every message failed for a week. The last time: ${sent.trouble}`;
      const rested = tx
        .update(webhook)
        .set({ restingSince: now, restingWhy: why })
        .where(eq(webhook.id, webhookId))
        .returning({ teamId: webhook.teamId, name: webhook.name })
        .get();
      if (!rested) return false;
      const { teamId, name } = rested;
      recordEvent(tx, { action: 'webhook.rest', teamId, thing: webhookId, detail: { name } }, now);
      return true;
    },
    { behavior: 'immediate' }
  );
}

/** When the first message was made that failed with none sent since, or when it was woken after that; now when there is none. */
function failingSince(db: Pick<Database, 'select'>, webhookId: string, now: number): number {
  const of = eq(webhookDelivery.webhookId, webhookId);
  const last = db
    .select({ at: webhookDelivery.endedAt })
    .from(webhookDelivery)
    .where(and(of, eq(webhookDelivery.status, 'sent')))
    .orderBy(desc(webhookDelivery.endedAt))
    .limit(1)
    .get();
  const first = db
    .select({ at: webhookDelivery.createdAt })
    .from(webhookDelivery)
    .where(and(of, ne(webhookDelivery.status, 'sent'), gt(webhookDelivery.createdAt, last?.at ?? 0)))
    .orderBy(asc(webhookDelivery.createdAt))
    .limit(1)
    .get();
  const woken = db.select({ at: webhook.awakeSince }).from(webhook).where(eq(webhook.id, webhookId)).get();
  return first ? Math.max(first.at, woken?.at ?? 0) : now;
}
