import { sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { webhook, webhookDelivery } from '../../db/schema';

/** Milliseconds that a claim lasts: longer than any attempt (10 s), so that only a crash lets one run out. */
export const LEASE = 60_000;

/** Longest wait that retryDelay gives, with room: what is due later was written before the clock was set back. */
const LATEST = 8 * 3_600_000;

export interface ClaimedDelivery {
  id: string;
  webhookId: string;
  body: string;
  /** Attempts with this one. */
  attempts: number;
  /** Somebody asked for it: it is tried this once. */
  byHand: boolean;
  url: string;
  sealedSecret: string;
}

/**
 * Takes the next message that is due, by one write, so of two processes one gets it. Of each webhook only the earliest
 * message that waits is looked at: messages arrive in order, and one that fails holds up those behind it until it is
 * sent or given up. A claim ends by settleDelivery, or after a minute when its process is gone: the message is then sent
 * again, though its receiver may have had it. What somebody asked for by hand goes before the others.
 */
export function claimDelivery(db: Database, now = Date.now()): ClaimedDelivery | null {
  const row = db
    .update(webhookDelivery)
    .set({ attempts: sql`${webhookDelivery.attempts} + 1`, dueAt: now + LEASE })
    .where(
      sql`${webhookDelivery.id} = (select d.id from webhook w join webhook_delivery d on d.id =
        (select e.id from webhook_delivery e where e.webhook_id = w.id and e.status = 'waiting'
          order by e.by_hand desc, e.event_id limit 1)
        where w.resting_since is null and (d.due_at <= ${now} or d.due_at > ${now + LATEST})
        order by d.due_at limit 1)`
    )
    .returning()
    .get() as typeof webhookDelivery.$inferSelect | undefined;
  if (!row) return null;
  const of = db
    .select({ url: webhook.url, sealedSecret: webhook.sealedSecret })
    .from(webhook)
    .where(sql`${webhook.id} = ${row.webhookId}`)
    .get();
  const { id, webhookId, body, attempts, byHand } = row;
  return of ? { id, webhookId, body, attempts, byHand, ...of } : null;
}
