import { isoMoment } from '$lib/model/api/shapes/moment';
import { siteMapSchema } from '$lib/model/api/shapes/site-map';
import { readSiteMap } from '$lib/server/services/site-maps/read-site-map';
import { askToken } from '../../../../ask-token';
import { problem } from '../../../../problem';
import { NOT_HERE, told } from '../../../answers';
import type { RequestHandler } from './$types';

/** A map of sites: its answer, conditions, and where its counts are; one that was put aside is not there. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readSiteMap(event.locals.db, asked.actor, event.params.id);
  if (!read.ok) return problem(NOT_HERE);
  return told(siteMapSchema, { ...read.map, createdAt: isoMoment(read.map.createdAt) });
};
