import { goToIssuer } from '$lib/server/auth/go-to-issuer';
import { ownPath } from '$lib/server/auth/own-path';
import { waysIn } from '$lib/server/services/accounts/ways-in';
import { error } from '@sveltejs/kit';
import { openToAll } from '../../../ask';
import type { RequestHandler } from './$types';

/** Goes to the institution's issuer; for somebody signed in, to tie their identity there to their account. */
export const POST: RequestHandler = async (event) => {
  openToAll();
  if (waysIn().issuer === null)
    error(404, { message: 'There is no page at this address.', code: 'not-found' });
  return goToIssuer(event, ownPath(event.url.searchParams.get('then')));
};
