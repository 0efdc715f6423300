import { authSecret } from '$lib/server/auth/auth-secret';
import { stopWatching, watchedTeams } from '$lib/server/services/watches/stop-watching';
import { readUnsubscribe } from '$lib/server/services/watches/unsubscribe-token';
import { error } from '@sveltejs/kit';
import { openToAll } from '../../ask';
import type { Actions, PageServerLoad } from './$types';

/** The token alone decides: who ends mail need not sign in for it. */
const whose = (token: string) =>
  readUnsubscribe(token, authSecret()) ??
  error(404, { message: 'This link ends no mail: part of it may be missing.', code: 'not-found' });

/** Changes nothing: programs that look through mail follow every link. */
export const load: PageServerLoad = (event) => {
  openToAll();
  return { teams: watchedTeams(event.locals.db, whose(event.params.token)) };
};

export const actions: Actions = {
  default: async (event) => {
    openToAll();
    stopWatching(event.locals.db, whose(event.params.token));
    return { told: 'Done. This mail has ended.' };
  }
};
