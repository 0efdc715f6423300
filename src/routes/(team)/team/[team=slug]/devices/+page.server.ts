import { listDevices } from '$lib/server/services/devices/list-devices';
import { askTeam } from '../../../../ask';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'see');
  return { devices: listDevices(event.locals.db, actor) };
};
