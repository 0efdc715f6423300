import { DELIVERY_STATUSES } from '$lib/model/webhooks/team-webhook';
import { deleteWebhook } from '$lib/server/services/webhooks/delete-webhook';
import { listDeliveries } from '$lib/server/services/webhooks/list-deliveries';
import { readWebhook } from '$lib/server/services/webhooks/list-webhooks';
import { resendDelivery } from '$lib/server/services/webhooks/resend-delivery';
import { restWebhook } from '$lib/server/services/webhooks/rest-webhook';
import { tryWebhook } from '$lib/server/services/webhooks/try-webhook';
import { error, fail, redirect } from '@sveltejs/kit';
import { askTeam } from '../../../../../ask';
import { SENDING } from '../refusals';
import type { Actions, PageServerLoad } from './$types';

/** Messages of one page. */
const A_PAGE = 50;

const notHere = (): never => error(404, { message: 'There is no page at this address.', code: 'not-found' });

export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'manage');
  const webhook = readWebhook(event.locals.db, actor, event.params.id) ?? notHere();
  const { searchParams } = event.url;
  const status = DELIVERY_STATUSES.find((known) => known === searchParams.get('status'));
  const before = Math.floor(Number(searchParams.get('before'))) || undefined;
  return {
    webhook,
    status: status ?? '',
    later: before !== undefined,
    ...listDeliveries(event.locals.db, actor, webhook.id, { limit: A_PAGE, status, before })
  };
};

export const actions: Actions = {
  try: async (event) => {
    const { actor } = askTeam(event, 'manage');
    const done = tryWebhook(event.locals.db, actor, event.params.id);
    if (done.ok) return { told: 'A trial message is on its way. What came of it will stand below.' };
    if (done.reason === 'unknown') notHere();
    else return fail(409, { problem: SENDING[done.reason] });
  },
  again: async (event) => {
    const { actor } = askTeam(event, 'manage');
    const deliveryId = String((await event.request.formData()).get('delivery'));
    const done = resendDelivery(event.locals.db, actor, { webhookId: event.params.id, deliveryId });
    if (done.ok) return { told: 'The message is on its way. What came of it will stand below.' };
    return fail(done.reason === 'unknown' ? 404 : 409, { problem: SENDING[done.reason] });
  },
  rest: async (event) => {
    const { actor } = askTeam(event, 'manage');
    if (!restWebhook(event.locals.db, actor, event.params.id, true).ok) notHere();
    return { told: 'It rests. What happens meanwhile is not told later.' };
  },
  wake: async (event) => {
    const { actor } = askTeam(event, 'manage');
    if (!restWebhook(event.locals.db, actor, event.params.id, false).ok) notHere();
    return { told: 'It is awake, and told of what happens from now on.' };
  },
  remove: async (event) => {
    const { team, actor } = askTeam(event, 'manage');
    const done = deleteWebhook(event.locals.db, actor, event.params.id);
    if (!done.ok) notHere();
    else redirect(303, `/team/${team.slug}/webhooks?removed=${encodeURIComponent(done.name)}`);
  }
};
