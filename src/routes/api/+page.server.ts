import { apiPage } from '$lib/model/api/api-page';
import { REFUSALS } from '$lib/model/api/refusals';
import { REQUEST_LIMITS } from '$lib/server/auth/request-limits';
import { openToAll } from '../ask';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = ({ url }) => {
  openToAll();
  return {
    origin: url.origin,
    parts: apiPage(),
    refusals: Object.entries(REFUSALS).map(([status, { about }]) => ({ status, about })),
    limit: REQUEST_LIMITS.token
  };
};
