import { gateQuery } from '$lib/model/api/operations/devices';
import { gateSchema } from '$lib/model/api/shapes/device';
import { isoMoment } from '$lib/model/api/shapes/moment';
import { findGate } from '$lib/server/services/gates/find-gate';
import { readGate } from '$lib/server/services/gates/read-gate';
import { askToken } from '../../../ask-token';
import { problem } from '../../../problem';
import { NOT_HERE, readQuery, told } from '../../answers';
import type { RequestHandler } from './$types';

const MISSING = {
  'no-device': 'The team has no such device: one is there once a dataset names it.',
  'no-version': 'The device has no such firmware version: one is there once a dataset names it.'
};
const NOT_YET = {
  'no-rule': 'This device has no rule for its gate yet: set one on its page.',
  'no-counts': 'No dataset of this version or its reference is there to judge.'
};

/** Whether a firmware version passes its gate. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readQuery(event.url, gateQuery);
  if (!read.ok) return read.response;
  const { db } = event.locals;
  const found = findGate(db, asked.actor, read.query);
  if (!found.ok) return problem({ status: 404, code: found.reason, title: MISSING[found.reason] });
  const { device, version } = found;
  const gate = readGate(db, asked.actor, device.id, version.id);
  if (!gate.ok)
    return problem(
      gate.reason === 'unknown' ? NOT_HERE : { status: 409, code: gate.reason, title: NOT_YET[gate.reason] }
    );
  const { report, waiting, decidedAt } = gate;
  const { outcome, statement } = report;
  return told(
    gateSchema,
    { outcome, statement, device, version, waiting, decidedAt: isoMoment(decidedAt), document: report },
    { headers: waiting.length > 0 ? { 'retry-after': '2' } : {} }
  );
};
