import { webhookSchema } from '$lib/model/api/shapes/webhook';
import { toWebhook } from '$lib/model/api/to-webhook';
import { deleteWebhook } from '$lib/server/services/webhooks/delete-webhook';
import { readWebhook } from '$lib/server/services/webhooks/list-webhooks';
import { askToken } from '../../../../ask-token';
import { problem } from '../../../../problem';
import { NOT_HERE, told } from '../../../answers';
import type { RequestHandler } from './$types';

/** A webhook, without its secret. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'webhooks');
  if (!asked.ok) return asked.response;
  const webhook = readWebhook(event.locals.db, asked.actor, event.params.id);
  return webhook ? told(webhookSchema, toWebhook(webhook)) : problem(NOT_HERE);
};

/** Removes a webhook, and tells it as it was. */
export const DELETE: RequestHandler = async (event) => {
  const asked = await askToken(event, 'webhooks');
  if (!asked.ok) return asked.response;
  const webhook = readWebhook(event.locals.db, asked.actor, event.params.id);
  if (!webhook || !deleteWebhook(event.locals.db, asked.actor, webhook.id).ok) return problem(NOT_HERE);
  return told(webhookSchema, toWebhook(webhook));
};
