import { deviceTimeline } from '$lib/server/services/devices/device-timeline';
import { readDevice } from '$lib/server/services/devices/read-device';
import { error } from '@sveltejs/kit';
import { askTeam } from '../../../../../../ask';
import { NO_DEVICE } from '../words';
import type { PageServerLoad } from './$types';

/** The versions of a device beside `?reference=…`, an id; drawn for `?group=…`, a name. */
export const load: PageServerLoad = async (event) => {
  const { actor } = askTeam(event, 'see');
  const { db } = event.locals;
  const read = readDevice(db, actor, event.params.id);
  if (!read.ok) error(404, NO_DEVICE);
  const asked = (name: string) => event.url.searchParams.get(name) || null;
  const drawn = await deviceTimeline(db, actor, event.params.id, {
    reference: asked('reference'),
    group: asked('group')
  });
  if (!drawn.ok) error(404, NO_DEVICE);
  return { device: { id: read.device.id, name: read.device.name }, timeline: drawn.timeline };
};
