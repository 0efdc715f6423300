import { askLinkSweep } from '../../../ask-link';
import type { PageServerLoad } from './$types';

/** What the link shows of a sweep, and nothing else: all of it stands in the page's source. */
export const load: PageServerLoad = (event) => ({ view: askLinkSweep(event).view });
