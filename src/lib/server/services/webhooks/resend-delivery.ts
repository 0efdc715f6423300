import { and, eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { webhook, webhookDelivery } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';
import { LEASE } from './claim-delivery';

export type ResentDelivery =
  | { ok: true }
  /** `under-way`: it is being sent just now. */
  | { ok: false; reason: 'unknown' | 'resting' | 'under-way' };

/**
 * Has a message sent again, or one that waits sent now, under the same id. One that had ended is tried this once; one
 * that waits keeps its later tries.
 */
export function resendDelivery(
  db: Database,
  actor: Actor,
  { webhookId, deliveryId }: { webhookId: string; deliveryId: string },
  now = Date.now()
): ResentDelivery {
  return db.transaction(
    (tx): ResentDelivery => {
      const found = tx
        .select({
          name: webhook.name,
          since: webhook.restingSince,
          status: webhookDelivery.status,
          dueAt: webhookDelivery.dueAt,
          tried: sql<number>`${webhookDelivery.attempts} > 0`
        })
        .from(webhookDelivery)
        .innerJoin(webhook, eq(webhook.id, webhookDelivery.webhookId))
        .where(
          and(
            eq(webhookDelivery.id, deliveryId),
            eq(webhook.id, webhookId),
            mayWhere(actor, 'manage', webhook.teamId)
          )
        )
        .get();
      if (!found) return { ok: false, reason: 'unknown' };
      if (found.since !== null) return { ok: false, reason: 'resting' };
      const waits = found.status === 'waiting';
      // A claim and a next try look alike but for their moment: what is due within a minute is soon sent anyway.
      if (waits && found.tried && found.dueAt !== null && found.dueAt > now && found.dueAt <= now + LEASE)
        return { ok: false, reason: 'under-way' };
      const { teamId, personId } = actor;
      const detail = { name: found.name };
      recordEvent(tx, { action: 'webhook.resend', teamId, personId, thing: webhookId, detail }, now);
      tx.update(webhookDelivery)
        .set({ status: 'waiting', dueAt: now, endedAt: null, byHand: !waits })
        .where(eq(webhookDelivery.id, deliveryId))
        .run();
      return { ok: true };
    },
    { behavior: 'immediate' }
  );
}
