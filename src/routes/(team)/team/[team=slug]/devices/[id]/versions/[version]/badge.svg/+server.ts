import { gateBadge } from '$lib/charts/gate-badge';
import { readVersion } from '$lib/server/services/devices/read-version';
import { readGate } from '$lib/server/services/gates/read-gate';
import { error } from '@sveltejs/kit';
import { askTeam } from '../../../../../../../../ask';
import { NO_DEVICE } from '../../../words';
import type { RequestHandler } from './$types';

/** The gate of a version as a picture, for members: what stands there now, so it is for nobody's cache. */
export const GET: RequestHandler = (event) => {
  const { actor } = askTeam(event, 'see');
  const { id, version } = event.params;
  const read = readVersion(event.locals.db, actor, id, version);
  if (!read.ok) error(404, NO_DEVICE);
  const gate = readGate(event.locals.db, actor, id, version);
  const picture = gateBadge(read.view.version.name, gate.ok ? gate.report.outcome : 'no-rule');
  return new Response(picture, {
    headers: { 'content-type': 'image/svg+xml; charset=utf-8', 'cache-control': 'no-store' }
  });
};
