import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { webhook } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { scriptOf } from '../access/script-of';
import { recordEvent } from '../events/record-event';

export type DeletedWebhook = { ok: true; name: string } | { ok: false; reason: 'unknown' };

/** Removes a webhook with its messages, for good: those that wait are not sent. */
export function deleteWebhook(db: Database, actor: Actor, id: string, now = Date.now()): DeletedWebhook {
  return db.transaction(
    (tx): DeletedWebhook => {
      const gone = tx
        .delete(webhook)
        .where(and(eq(webhook.id, id), mayWhere(actor, 'manage', webhook.teamId)))
        .returning({ name: webhook.name })
        .get();
      if (!gone) return { ok: false, reason: 'unknown' };
      const { teamId, personId } = actor;
      const detail = { name: gone.name, ...scriptOf(actor) };
      recordEvent(tx, { action: 'webhook.delete', teamId, personId, thing: id, detail }, now);
      return { ok: true, name: gone.name };
    },
    { behavior: 'immediate' }
  );
}
