import { acceptInvitation } from '$lib/server/services/invitations/accept-invitation';
import { readInvitation } from '$lib/server/services/invitations/read-invitation';
import { error, fail, redirect } from '@sveltejs/kit';
import { openToAll } from '../../ask';
import type { Actions, PageServerLoad } from './$types';

/*
 * The address is the secret. It goes to nobody else: the referrer policy of every page (security-headers.ts) keeps it
 * from other sites, nothing on the page is fetched from elsewhere, and no cache or index may keep it.
 */
export const load: PageServerLoad = ({ locals, params, setHeaders }) => {
  openToAll();
  setHeaders({ 'cache-control': 'no-store', 'x-robots-tag': 'noindex' });
  const read = readInvitation(locals.db, params.token, locals.person?.id ?? null);
  const me = locals.person?.email ?? null;
  if (read.ok) {
    const { email, role, teamName, teamSlug, by, expiresAt } = read.invitation;
    return {
      open: {
        email,
        role,
        teamName,
        by,
        expiresAt,
        fit: read.fit,
        slug: read.fit === 'member' ? teamSlug : null
      },
      closed: null,
      me
    };
  }
  if (read.reason === 'unknown')
    error(404, {
      message:
        'This address opens no invitation. Check that it is whole; when the invitation was sent again, only the newest mail counts.',
      code: 'not-found'
    });
  return { open: null, closed: { reason: read.reason, slug: read.teamSlug ?? null }, me };
};

export const actions: Actions = {
  default: ({ locals, params, url }) => {
    openToAll();
    if (!locals.person) redirect(303, `/sign-in?then=${encodeURIComponent(url.pathname)}`);
    const done = acceptInvitation(locals.db, locals.person.id, params.token);
    if (done.ok) redirect(303, `/team/${done.teamSlug}`);
    // The page below says which it is: it is read anew.
    return fail(409, { problem: 'It could not be accepted.' });
  }
};
