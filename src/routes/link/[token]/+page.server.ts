import { askLink } from '../../ask-link';
import type { PageServerLoad } from './$types';

/** What the link shows, and nothing else: all of it stands in the page's source. */
export const load: PageServerLoad = (event) => {
  const { view } = askLink(event, 'see');
  return { view };
};
