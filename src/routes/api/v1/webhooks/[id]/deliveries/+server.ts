import { deliveriesQuery, deliveryPageSchema } from '$lib/model/api/operations/webhooks';
import { toDelivery } from '$lib/model/api/to-webhook';
import { listDeliveries } from '$lib/server/services/webhooks/list-deliveries';
import { readWebhook } from '$lib/server/services/webhooks/list-webhooks';
import { askToken } from '../../../../../ask-token';
import { problem } from '../../../../../problem';
import { BAD_CURSOR, nextPage, NOT_HERE, readQuery, told } from '../../../../answers';
import type { RequestHandler } from './$types';

/** A page of what was sent to a webhook, and what waits. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'webhooks');
  if (!asked.ok) return asked.response;
  const read = readQuery(event.url, deliveriesQuery);
  if (!read.ok) return read.response;
  const { limit, status, after } = read.query;
  if (after !== undefined && !/^[1-9]\d{0,14}$/.test(after)) return problem(BAD_CURSOR);
  const { db } = event.locals;
  if (!readWebhook(db, asked.actor, event.params.id)) return problem(NOT_HERE);
  const before = after === undefined ? undefined : Number(after);
  const page = listDeliveries(db, asked.actor, event.params.id, { limit, status, before });
  const next = page.next === null ? null : String(page.next);
  const data = page.deliveries.map(toDelivery);
  return told(deliveryPageSchema, { data, next }, { headers: nextPage(event.url, next) });
};
