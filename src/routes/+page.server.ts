import { listSamples } from '$lib/server/services/samples';
import type { PageServerLoad } from './$types';

/** The examples beside the form; their text comes when one is chosen. */
export const load: PageServerLoad = ({ locals }) => ({ samples: listSamples(locals.db) });
