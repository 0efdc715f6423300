import { haveStill } from '$lib/page/kept/stills';
import type { PageLoad } from './$types';

export const load: PageLoad = async ({ data }) => {
  await haveStill('shared');
  return data;
};
