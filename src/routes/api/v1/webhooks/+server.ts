import { webhookListSchema } from '$lib/model/api/operations/webhooks';
import { newWebhookSchema } from '$lib/model/api/shapes/webhook';
import { toWebhook } from '$lib/model/api/to-webhook';
import { listWebhooks, readWebhook } from '$lib/server/services/webhooks/list-webhooks';
import { makeWebhook } from '$lib/server/services/webhooks/make-webhook';
import { webhookSettings } from '$lib/server/services/webhooks/webhook-settings';
import { MAKING } from '../../../(team)/team/[team=slug]/webhooks/refusals';
import { askToken } from '../../../ask-token';
import { NOT_HERE, told } from '../../answers';
import { jsonBody } from '../../json-body';
import { posted } from '../../posted';
import type { RequestHandler } from './$types';

const STATUS = { 'inner-address': 422, 'too-many': 409, 'not-allowed': 403 } as const;

/** The team's webhooks: at most 20, so all at once. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'webhooks');
  if (!asked.ok) return asked.response;
  const data = listWebhooks(event.locals.db, asked.actor).map(toWebhook);
  return told(webhookListSchema, { data, next: null });
};

/** Makes a webhook. Its secret is in the first answer alone: what is kept under an Idempotency-Key has none. */
export const POST: RequestHandler = async (event) => {
  const asked = await askToken(event, 'webhooks');
  if (!asked.ok) return asked.response;
  const { db } = event.locals;
  const { actor } = asked;
  let secret: string | null = null;
  const response = await posted(event, asked, (bytes, type) => {
    const read = jsonBody(bytes, type, newWebhookSchema);
    if (!read.ok) return { refused: read.refused };
    const made = makeWebhook(db, actor, read.data, webhookSettings());
    if (!made.ok) {
      const title = MAKING[made.reason];
      return { refused: { status: STATUS[made.reason], code: made.reason, title } };
    }
    const webhook = readWebhook(db, actor, made.id);
    if (!webhook) return { refused: NOT_HERE };
    secret = made.secret;
    const body = JSON.stringify({ ...toWebhook(webhook), secret: null });
    return { done: { status: 201, location: `/api/v1/webhooks/${made.id}`, body } };
  });
  if (secret === null || response.status !== 201) return response;
  const body = { ...((await response.json()) as object), secret };
  return new Response(JSON.stringify(body), { status: 201, headers: response.headers });
};
