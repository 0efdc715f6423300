import { listSamples } from '$lib/server/services/samples';
import { openToAll } from './ask';
import type { PageServerLoad } from './$types';

/** The examples beside the form; their text comes when one is chosen. */
export const load: PageServerLoad = ({ locals }) => {
  openToAll();
  return { samples: listSamples(locals.db) };
};
