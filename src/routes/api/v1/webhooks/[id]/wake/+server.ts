import { askToken } from '../../../../../ask-token';
import { posted } from '../../../../posted';
import { restOrWake } from '../../rest-or-wake';
import type { RequestHandler } from './$types';

/** Wakes a webhook; one that is awake stays so. */
export const POST: RequestHandler = async (event) => {
  const asked = await askToken(event, 'webhooks');
  if (!asked.ok) return asked.response;
  return posted(event, asked, () => restOrWake(event.locals.db, asked.actor, event.params.id, false));
};
