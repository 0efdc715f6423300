import { readVersion } from '$lib/server/services/devices/read-version';
import { readGate } from '$lib/server/services/gates/read-gate';
import { error } from '@sveltejs/kit';
import { askTeam } from '../../../../../../../ask';
import { NO_DEVICE } from '../../words';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'see');
  const read = readVersion(event.locals.db, actor, event.params.id, event.params.version);
  if (!read.ok) error(404, NO_DEVICE);
  return { ...read.view, gate: readGate(event.locals.db, actor, event.params.id, event.params.version) };
};
