import { ruleQuery } from '$lib/model/api/operations/devices';
import { gateRuleSchema, newRuleSchema } from '$lib/model/api/shapes/device';
import { toRule } from '$lib/model/api/to-rule';
import { sayNoGroups } from '$lib/model/team/devices/gate';
import { findNamedDevice } from '$lib/server/services/gates/find-named-device';
import { readRule } from '$lib/server/services/gates/read-rule';
import { setNamedRule } from '$lib/server/services/gates/set-named-rule';
import { askToken } from '../../../../ask-token';
import { problem, type Problem } from '../../../../problem';
import { readQuery, told } from '../../../answers';
import { jsonOf } from '../../../json-of';
import { posted } from '../../../posted';
import type { RequestHandler } from './$types';

const NO_DEVICE: Problem = {
  status: 404,
  code: 'no-device',
  title: 'The team has no such device: one is there once a dataset names it.'
};
const REFUSALS: Record<'unknown' | 'no-version' | 'stale', Problem> = {
  unknown: NO_DEVICE,
  'no-version': {
    status: 422,
    code: 'no-version',
    title: 'The device has no such firmware version for a reference: one is there once a dataset names it.'
  },
  stale: {
    status: 409,
    code: 'stale',
    title: 'Somebody set another rule in this very moment. Read it, and send yours again if it still holds.'
  }
};

/** The rule of a device's gate. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readQuery(event.url, ruleQuery);
  if (!read.ok) return read.response;
  const device = findNamedDevice(event.locals.db, asked.actor, read.query.device);
  if (!device) return problem(NO_DEVICE);
  const rule = readRule(event.locals.db, asked.actor, device.id);
  if (!rule)
    return problem({ status: 409, code: 'no-rule', title: 'This device has no rule for its gate yet.' });
  return told(gateRuleSchema, toRule(rule));
};

/** Sets the rule of a device's gate. */
export const PUT: RequestHandler = async (event) => {
  const asked = await askToken(event, 'edit');
  if (!asked.ok) return asked.response;
  const read = readQuery(event.url, ruleQuery);
  if (!read.ok) return read.response;
  return posted(event, asked, (bytes, type) => {
    const body = jsonOf(bytes, type, newRuleSchema);
    if (!body.ok) return { refused: body.refused };
    const set = setNamedRule(event.locals.db, asked.actor, read.query.device, body.body);
    if (!set.ok && set.reason === 'no-group')
      return { refused: { status: 422, code: 'no-group', title: sayNoGroups(set.groups) } };
    if (!set.ok) return { refused: REFUSALS[set.reason] };
    return { done: { status: 200, location: null, body: JSON.stringify(toRule(set.rule)) } };
  });
};
