import type { TeamWebhook } from '$lib/model/webhooks/team-webhook';
import type { ToldAction } from '$lib/model/webhooks/told-actions';
import { and, asc, desc, eq, sql, type SQL } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { person, webhook } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

/** The team's webhooks, the newest first; for leads. A team has at most 20, so they come in no pages. */
export const listWebhooks = (db: Database, actor: Actor): TeamWebhook[] => rowsOf(db, actor);

/** One of them; null for what is not there, or not for this actor. */
export const readWebhook = (db: Database, actor: Actor, id: string): TeamWebhook | null =>
  rowsOf(db, actor, eq(webhook.id, id)).at(0) ?? null;

function rowsOf(db: Database, actor: Actor, where?: SQL): TeamWebhook[] {
  const rows = db
    .select({
      id: webhook.id,
      name: webhook.name,
      url: webhook.url,
      actions: webhook.actions,
      by: person.name,
      createdAt: webhook.createdAt,
      restingSince: webhook.restingSince,
      restingWhy: webhook.restingWhy,
      waiting: sql<number>`(select count(*) from webhook_delivery d
        where d.webhook_id = ${webhook.id} and d.status = 'waiting')`,
      lastSentAt: sql<number | null>`(select max(d.ended_at) from webhook_delivery d
        where d.webhook_id = ${webhook.id} and d.status = 'sent')`
    })
    .from(webhook)
    .leftJoin(person, eq(person.id, webhook.createdBy))
    .where(and(mayWhere(actor, 'manage', webhook.teamId), where))
    .orderBy(desc(webhook.createdAt), asc(webhook.id))
    .all();
  return rows.map((row) => ({ ...row, actions: JSON.parse(row.actions) as ToldAction[] }));
}
