import { listSiteMaps } from '$lib/server/services/site-maps/list-site-maps';
import { restoreSiteMap } from '$lib/server/services/site-maps/restore-site-map';
import { fail, redirect } from '@sveltejs/kit';
import { askTeam } from '../../../../ask';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'see');
  const page = Math.floor(Number(event.url.searchParams.get('page') ?? 1)) || 1;
  return { list: listSiteMaps(event.locals.db, actor, page) };
};

export const actions: Actions = {
  /** Brings back what was just put aside. */
  restore: async (event) => {
    const { team, actor } = askTeam(event, 'see');
    const id = String((await event.request.formData()).get('map') ?? '');
    // Whose it is decides: the service asks it of the row itself.
    if (restoreSiteMap(event.locals.db, actor, id).ok) redirect(303, `/team/${team.slug}/sites/${id}`);
    return fail(404, { message: 'That map is not put aside, or not yours to bring back.' });
  }
};
