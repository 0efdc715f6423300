import { and, desc, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { event, team, webhook, webhookDelivery } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';

/** A trial message at a time: a second one within this many milliseconds is a second click. */
const TWICE = 5000;

export type TriedWebhook =
  { ok: true; name: string } | { ok: false; reason: 'unknown' | 'resting' | 'too-soon' };

/** Has a trial message sent, signed like any other. It goes before those that wait and is tried once. */
export function tryWebhook(db: Database, actor: Actor, id: string, now = Date.now()): TriedWebhook {
  return db.transaction(
    (tx): TriedWebhook => {
      const found = tx
        .select({ name: webhook.name, since: webhook.restingSince, slug: team.slug })
        .from(webhook)
        .innerJoin(team, eq(team.id, webhook.teamId))
        .where(and(eq(webhook.id, id), mayWhere(actor, 'manage', webhook.teamId)))
        .get();
      if (!found) return { ok: false, reason: 'unknown' };
      if (found.since !== null) return { ok: false, reason: 'resting' };
      const tried = and(eq(webhookDelivery.webhookId, id), eq(webhookDelivery.action, 'webhook.try'));
      const last = tx
        .select({ at: webhookDelivery.createdAt })
        .from(webhookDelivery)
        .where(tried)
        .orderBy(desc(webhookDelivery.eventId))
        .limit(1)
        .get();
      if (last && Math.abs(now - last.at) < TWICE) return { ok: false, reason: 'too-soon' };
      const { teamId, personId } = actor;
      const action = 'webhook.try';
      recordEvent(tx, { action, teamId, personId, thing: id, detail: { name: found.name } }, now);
      const made = tx.select({ id: event.id }).from(event).orderBy(desc(event.id)).limit(1).get()!;
      const data = { event: made.id, team: found.slug, thing: id, facts: {} };
      const body = JSON.stringify({ type: action, timestamp: new Date(now).toISOString(), data });
      const row = { id: newId(), webhookId: id, eventId: made.id, action, body, createdAt: now, dueAt: now };
      tx.insert(webhookDelivery)
        .values({ ...row, status: 'waiting', byHand: true })
        .run();
      return { ok: true, name: found.name };
    },
    { behavior: 'immediate' }
  );
}
