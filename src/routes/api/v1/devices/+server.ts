import { deviceListSchema } from '$lib/model/api/shapes/device';
import { listDevices } from '$lib/server/services/devices/list-devices';
import { askToken } from '../../../ask-token';
import { told } from '../../answers';
import type { RequestHandler } from './$types';

/** The devices of the team. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  return told(deviceListSchema, { data: listDevices(event.locals.db, asked.actor) });
};
