import { readSiteMap } from '$lib/server/services/site-maps/read-site-map';
import { attachment } from '../../../../../(team)/team/[team=slug]/datasets/attachment';
import { askToken } from '../../../../../ask-token';
import { problem } from '../../../../../problem';
import { NOT_HERE } from '../../../../answers';
import type { RequestHandler } from './$types';

/** The document of a map of sites, byte for byte as it was stored. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readSiteMap(event.locals.db, asked.actor, event.params.id);
  if (!read.ok) return problem(NOT_HERE);
  return attachment(read.text, `${read.map.name}.json`, 'application/json');
};
