import type { DeliveryStatus, TeamDelivery } from '$lib/model/webhooks/team-webhook';
import { and, desc, eq, lt } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { webhook, webhookDelivery } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

export interface AskedDeliveries {
  limit: number;
  status?: DeliveryStatus;
  /** Messages of earlier events than this one: the `next` of the page before. */
  before?: number;
}

export interface DeliveryPage {
  deliveries: TeamDelivery[];
  /** For `before` of the next page; null on the last. */
  next: number | null;
}

/**
 * Messages of a webhook, the newest event first, by the number of the event: what is added or purged meanwhile makes
 * nothing appear twice or be missed. For leads; nothing for others.
 */
export function listDeliveries(
  db: Database,
  actor: Actor,
  webhookId: string,
  { limit, status, before }: AskedDeliveries
): DeliveryPage {
  const rows = db
    .select({
      id: webhookDelivery.id,
      eventId: webhookDelivery.eventId,
      action: webhookDelivery.action,
      body: webhookDelivery.body,
      status: webhookDelivery.status,
      attempts: webhookDelivery.attempts,
      dueAt: webhookDelivery.dueAt,
      answered: webhookDelivery.answered,
      trouble: webhookDelivery.trouble,
      createdAt: webhookDelivery.createdAt,
      endedAt: webhookDelivery.endedAt
    })
    .from(webhookDelivery)
    .innerJoin(webhook, eq(webhook.id, webhookDelivery.webhookId))
    .where(
      and(
        eq(webhookDelivery.webhookId, webhookId),
        mayWhere(actor, 'manage', webhook.teamId),
        status === undefined ? undefined : eq(webhookDelivery.status, status),
        before === undefined ? undefined : lt(webhookDelivery.eventId, before)
      )
    )
    .orderBy(desc(webhookDelivery.eventId))
    .limit(limit + 1)
    .all();
  const deliveries = rows.slice(0, limit);
  return { deliveries, next: rows.length > limit ? deliveries[limit - 1].eventId : null };
}
