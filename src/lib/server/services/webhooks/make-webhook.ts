import type { WebhookForm } from '$lib/model/webhooks/webhook-form';
import { count, eq } from 'drizzle-orm';
import { randomBytes } from 'node:crypto';
import { isIP } from 'node:net';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { team, webhook } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';
import { scriptOf } from '../access/script-of';
import { isInnerAddress } from './is-inner-address';
import { newestEvent } from '../events/newest-event';
import { sealSecret } from './seal-secret';
import { SECRET_PREFIX } from './sign-message';

/** Webhooks that one team may have. */
export const MOST_WEBHOOKS = 20;

export type MadeWebhook =
  | { ok: true; id: string; secret: string }
  /** `inner-address`: the address names loopback or a private network. */
  | { ok: false; reason: 'not-allowed' | 'too-many' | 'inner-address' };

export interface WebhookSettings {
  /** The server's key, which seals the secret. */
  serverSecret: string;
  /** Whether addresses inside the server's own network are taken. */
  allowInner: boolean;
}

/**
 * Makes a webhook of the team, for leads. Its secret of 256 random bits is in the answer and nowhere else in the open.
 * It is told of what happens from now on, not of the past. A host name is looked up at each sending, not here: what it
 * points to may change.
 */
export function makeWebhook(
  db: Database,
  actor: Actor,
  form: WebhookForm,
  { serverSecret, allowInner }: WebhookSettings,
  now = Date.now()
): MadeWebhook {
  const host = new URL(form.url).hostname.replace(/^\[|\]$/g, '').replace(/\.$/, '');
  const inner = isIP(host) ? isInnerAddress(host) : host === 'localhost' || host.endsWith('.localhost');
  if (inner && !allowInner) return { ok: false, reason: 'inner-address' };
  return db.transaction(
    (tx): MadeWebhook => {
      const mine = tx
        .select({ id: team.id })
        .from(team)
        .where(mayWhere(actor, 'manage', team.id))
        .get();
      if (!mine) return { ok: false, reason: 'not-allowed' };
      const kept = tx.select({ n: count() }).from(webhook).where(eq(webhook.teamId, actor.teamId)).get();
      if ((kept?.n ?? 0) >= MOST_WEBHOOKS) return { ok: false, reason: 'too-many' };
      const id = newId();
      const secret = SECRET_PREFIX + randomBytes(32).toString('base64');
      const detail = { name: form.name, ...scriptOf(actor) };
      const { teamId, personId } = actor;
      recordEvent(tx, { action: 'webhook.make', teamId, personId, thing: id, detail }, now);
      tx.insert(webhook)
        .values({
          id,
          teamId,
          name: form.name,
          url: form.url,
          sealedSecret: sealSecret(secret, id, serverSecret),
          actions: JSON.stringify([...new Set(form.actions)]),
          lastEvent: newestEvent(tx),
          createdBy: personId,
          createdAt: now
        })
        .run();
      return { ok: true, id, secret };
    },
    { behavior: 'immediate' }
  );
}
