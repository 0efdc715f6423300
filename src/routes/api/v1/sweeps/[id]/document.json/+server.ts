import { readSweep } from '$lib/server/services/sweeps/read-sweep';
import { attachment } from '../../../../../(team)/team/[team=slug]/datasets/attachment';
import { askToken } from '../../../../../ask-token';
import { problem } from '../../../../../problem';
import { NOT_HERE } from '../../../../answers';
import type { RequestHandler } from './$types';

/** The document of a sweep, byte for byte as it was stored. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readSweep(event.locals.db, asked.actor, event.params.id);
  if (!read.ok) return problem(NOT_HERE);
  return attachment(read.sweep.text, `${read.sweep.name}.json`, 'application/json');
};
