import { clientOf } from '$lib/server/auth/client-of';
import { outbox } from '$lib/server/services/accounts/outbox';
import { error } from '@sveltejs/kit';
import { openToAll } from '../../ask';
import type { PageServerLoad } from './$types';

/** Open to all who sit at this machine, in local mode alone; for everybody else there is no such page. */
export const load: PageServerLoad = (event) => {
  openToAll();
  const messages = outbox(event.locals.db, clientOf(event));
  if (messages === null) error(404, { message: 'There is no page at this address.', code: 'not-found' });
  event.setHeaders({ 'cache-control': 'no-store' });
  return { messages };
};
