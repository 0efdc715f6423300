import { can } from '$lib/server/access/can';
import { comparableMaps } from '$lib/server/services/site-maps/comparable-maps';
import { openSiteMap } from '$lib/server/services/site-maps/open-site-map';
import { putSiteMapAside } from '$lib/server/services/site-maps/put-site-map-aside';
import { error, redirect } from '@sveltejs/kit';
import { askTeam } from '../../../../../ask';
import type { Actions, PageServerLoad } from './$types';

const gone = (): never => error(404, { message: 'There is no page at this address.', code: 'not-found' });

export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'see');
  const read = openSiteMap(event.locals.db, actor, event.params.id);
  if (!read.ok) return gone();
  const { map, document } = read;
  return {
    map,
    document,
    others: comparableMaps(event.locals.db, actor, map),
    mayPutAside: can({ kind: 'member', ...actor }, 'delete', { createdBy: map.createdBy })
  };
};

export const actions: Actions = {
  aside: async (event) => {
    const { actor, team } = askTeam(event, 'see');
    // Whose it is decides: the service asks it of the row itself.
    if (!putSiteMapAside(event.locals.db, actor, event.params.id).ok) return gone();
    redirect(303, `/team/${team.slug}/sites?aside=${event.params.id}`);
  }
};
