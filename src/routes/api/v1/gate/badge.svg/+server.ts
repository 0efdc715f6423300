import { gateBadge } from '$lib/charts/gate-badge';
import { gateQuery } from '$lib/model/api/operations/devices';
import { findGate } from '$lib/server/services/gates/find-gate';
import { readGate } from '$lib/server/services/gates/read-gate';
import { askToken } from '../../../../ask-token';
import { problem } from '../../../../problem';
import { readQuery } from '../../../answers';
import type { RequestHandler } from './$types';

const MISSING = {
  'no-device': 'The team has no such device: one is there once a dataset names it.',
  'no-version': 'The device has no such firmware version: one is there once a dataset names it.'
};

/** The gate of a version as a picture; what stands there now, so it is for nobody's cache. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readQuery(event.url, gateQuery);
  if (!read.ok) return read.response;
  const { db } = event.locals;
  const found = findGate(db, asked.actor, read.query);
  if (!found.ok) return problem({ status: 404, code: found.reason, title: MISSING[found.reason] });
  const gate = readGate(db, asked.actor, found.device.id, found.version.id);
  return new Response(gateBadge(found.version.name, gate.ok ? gate.report.outcome : 'no-rule'), {
    headers: { 'content-type': 'image/svg+xml', 'cache-control': 'no-store' }
  });
};
