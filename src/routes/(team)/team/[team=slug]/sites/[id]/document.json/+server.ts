import { readSiteMap } from '$lib/server/services/site-maps/read-site-map';
import { askTeamJson } from '../../../../../../ask-json';
import { problem } from '../../../../../../problem';
import { attachment } from '../../../datasets/attachment';
import type { RequestHandler } from './$types';

/** The document of a map of sites, byte for byte as it was stored. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const read = readSiteMap(event.locals.db, asked.actor, event.params.id);
  if (!read.ok)
    return problem({ status: 404, code: 'not-found', title: 'There is nothing at this address.' });
  return attachment(read.text, `${read.map.name}.json`, 'application/json');
};
