import { deviceSchema } from '$lib/model/api/shapes/device';
import { toRule } from '$lib/model/api/to-rule';
import { readDevice } from '$lib/server/services/devices/read-device';
import { readRule } from '$lib/server/services/gates/read-rule';
import { askToken } from '../../../../ask-token';
import { problem } from '../../../../problem';
import { NOT_HERE, told } from '../../../answers';
import type { RequestHandler } from './$types';

/** A device with its versions in order and the rule of its gate. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const { db } = event.locals;
  const read = readDevice(db, asked.actor, event.params.id);
  if (!read.ok) return problem(NOT_HERE);
  const { id, name, notes } = read.device;
  const versions = read.device.versions.map((one) => ({
    id: one.id,
    name: one.name,
    notes: one.notes,
    datasets: one.datasets
  }));
  const rule = readRule(db, asked.actor, id);
  return told(deviceSchema, { id, name, notes, versions, rule: rule && toRule(rule) });
};
