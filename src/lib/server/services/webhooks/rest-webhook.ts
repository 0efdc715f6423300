import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { webhook } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { scriptOf } from '../access/script-of';
import { recordEvent } from '../events/record-event';
import { newestEvent } from '../events/newest-event';

export type RestedWebhook =
  /** `changed`: false when it rested, or was awake, before. */
  { ok: true; name: string; changed: boolean } | { ok: false; reason: 'unknown' };

/**
 * Puts a webhook to rest, or wakes it. What happens while it rests is not told later: it goes on with what happens from
 * now on. Messages that waited when it was put to rest are sent when it wakes.
 */
export function restWebhook(
  db: Database,
  actor: Actor,
  id: string,
  rests: boolean,
  now = Date.now()
): RestedWebhook {
  return db.transaction(
    (tx): RestedWebhook => {
      const mine = and(eq(webhook.id, id), mayWhere(actor, 'manage', webhook.teamId));
      const found = tx
        .select({ name: webhook.name, since: webhook.restingSince })
        .from(webhook)
        .where(mine)
        .get();
      if (!found) return { ok: false, reason: 'unknown' };
      const { name, since } = found;
      if ((since !== null) === rests) return { ok: true, name, changed: false };
      const { teamId, personId } = actor;
      const action = rests ? 'webhook.rest' : 'webhook.wake';
      const detail = { name, ...(rests ? { byHand: true } : {}), ...scriptOf(actor) };
      recordEvent(tx, { action, teamId, personId, thing: id, detail }, now);
      tx.update(webhook)
        .set(
          rests
            ? { restingSince: now, restingWhy: null }
            : { restingSince: null, restingWhy: null, awakeSince: now, lastEvent: newestEvent(tx) }
        )
        .where(mine)
        .run();
      return { ok: true, name, changed: true };
    },
    { behavior: 'immediate' }
  );
}
