import { toWebhook } from '$lib/model/api/to-webhook';
import type { Actor } from '$lib/server/services/access/actor';
import type { Outcome } from '$lib/server/services/idempotency/once';
import { readWebhook } from '$lib/server/services/webhooks/list-webhooks';
import { restWebhook } from '$lib/server/services/webhooks/rest-webhook';
import type { Problem } from '../../../problem';
import { NOT_HERE } from '../../answers';

/** Puts a webhook to rest or wakes it, and tells how it stands then. */
export function restOrWake(db: App.Locals['db'], actor: Actor, id: string, rests: boolean): Outcome<Problem> {
  const done = restWebhook(db, actor, id, rests);
  const webhook = done.ok ? readWebhook(db, actor, id) : null;
  if (!webhook) return { refused: NOT_HERE };
  return { done: { status: 200, location: null, body: JSON.stringify(toWebhook(webhook)) } };
}
