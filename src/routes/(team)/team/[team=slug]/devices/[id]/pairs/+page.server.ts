import { compareVersions } from '$lib/server/services/devices/compare-versions';
import { readDevice } from '$lib/server/services/devices/read-device';
import { error } from '@sveltejs/kit';
import { askTeam } from '../../../../../../ask';
import { NO_DEVICE } from '../words';
import type { PageServerLoad } from './$types';

/** Versions of one group pair by pair: `?group=…&version=…&version=…`. Nothing is counted before two are asked for. */
export const load: PageServerLoad = async (event) => {
  const { actor } = askTeam(event, 'see');
  const { db } = event.locals;
  const { searchParams } = event.url;
  const read = readDevice(db, actor, event.params.id);
  if (!read.ok) error(404, NO_DEVICE);
  const asked = { group: searchParams.get('group') || null, versions: searchParams.getAll('version') };
  const compared = await compareVersions(db, actor, event.params.id, asked);
  if (!compared.ok) error(404, NO_DEVICE);
  return { device: { id: read.device.id, name: read.device.name }, pairs: compared.pairs };
};
