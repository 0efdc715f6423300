import { readSweep } from '$lib/server/services/sweeps/read-sweep';
import { askTeamJson } from '../../../../../../ask-json';
import { problem } from '../../../../../../problem';
import { attachment } from '../../../datasets/attachment';
import type { RequestHandler } from './$types';

/** The document of a sweep, byte for byte as it was stored. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const read = readSweep(event.locals.db, asked.actor, event.params.id);
  if (!read.ok)
    return problem({ status: 404, code: 'not-found', title: 'There is nothing at this address.' });
  return attachment(read.sweep.text, `${read.sweep.name}.json`, 'application/json');
};
