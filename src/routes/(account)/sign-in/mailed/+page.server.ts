import { beginSession } from '$lib/server/auth/begin-session';
import { ownPath } from '$lib/server/auth/own-path';
import { findMailedToken } from '$lib/server/services/accounts/mailed-token';
import { signInByMail } from '$lib/server/services/accounts/sign-in-by-mail';
import { fail, redirect } from '@sveltejs/kit';
import { openToAll } from '../../../ask';
import { LINK_REFUSALS } from '../../refusals';
import type { Actions, PageServerLoad } from './$types';

/** Shows a button and uses nothing up: mail scanners open every link, and people press. */
export const load: PageServerLoad = ({ locals, url, setHeaders }) => {
  openToAll();
  setHeaders({ 'cache-control': 'no-store' });
  const found = findMailedToken(locals.db, 'sign-in', url.searchParams.get('token') ?? '');
  return found.ok
    ? { email: found.email, problem: null }
    : { email: null, problem: LINK_REFUSALS[found.reason] };
};

export const actions: Actions = {
  default: async (event) => {
    openToAll();
    const used = signInByMail(event.locals.db, event.url.searchParams.get('token') ?? '');
    if (!used.ok) return fail(400, { problem: LINK_REFUSALS[used.reason] });
    await beginSession(event, used.personId);
    redirect(303, ownPath(event.url.searchParams.get('then')));
  }
};
