import { compareSiteMaps } from '$lib/server/services/site-maps/compare-site-maps';
import { error } from '@sveltejs/kit';
import { askTeam } from '../../../../../ask';
import type { PageServerLoad } from './$types';

/** Two maps side by side: `?a=…&b=…`, the earlier and the later. */
export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'see');
  const [a, b] = ['a', 'b'].map((name) => event.url.searchParams.get(name) ?? '');
  const compared = compareSiteMaps(event.locals.db, actor, a, b);
  if (compared.ok) {
    const { earlier, later, document } = compared;
    return { earlier, later, document, why: null };
  }
  if (compared.reason === 'unknown')
    error(404, { message: 'There is no page at this address.', code: 'not-found' });
  const { earlier, later, why } = compared;
  return { earlier, later, document: null, why };
};
