import { siteMapPageSchema, siteMapsQuery } from '$lib/model/api/operations/site-maps';
import { isoMoment } from '$lib/model/api/shapes/moment';
import { newSiteMapQuery } from '$lib/model/api/shapes/site-map';
import { pageOfSiteMaps } from '$lib/server/services/site-maps/page-of-site-maps';
import { readSiteMap } from '$lib/server/services/site-maps/read-site-map';
import { saveSiteMap } from '$lib/server/services/site-maps/save-site-map';
import { askToken } from '../../../ask-token';
import { problem } from '../../../problem';
import { BAD_CURSOR, nextPage, NOT_HERE, readQuery, told } from '../../answers';
import { posted } from '../../posted';
import { uploadRefusal } from '../../upload-refusal';
import type { RequestHandler } from './$types';

/** A page of the team's maps of sites. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readQuery(event.url, siteMapsQuery);
  if (!read.ok) return read.response;
  const found = pageOfSiteMaps(event.locals.db, asked.actor, read.query);
  if (!found.ok) return problem(BAD_CURSOR);
  const { entries, next } = found.page;
  const data = entries.map((entry) => ({ ...entry, createdAt: isoMoment(entry.createdAt) }));
  return told(siteMapPageSchema, { data, next }, { headers: nextPage(event.url, next) });
};

/** Saves the map of the site-resolved shots of the body, with their counts. */
export const POST: RequestHandler = async (event) => {
  const asked = await askToken(event, 'upload');
  if (!asked.ok) return asked.response;
  const { db } = event.locals;
  const { actor } = asked;
  const read = readQuery(event.url, newSiteMapQuery);
  if (!read.ok) return read.response;
  const {
    name = 'Sites',
    geometry,
    seek,
    alpha,
    device = null,
    firmware = null,
    group = null,
    kinks
  } = read.query;
  return posted(event, asked, (bytes, type) => {
    if (type !== 'text/csv')
      return {
        refused: {
          status: 415,
          code: 'wrong-type',
          title: 'Send the shots as text/csv, and say so in Content-Type.'
        }
      };
    const saved = saveSiteMap(db, actor, {
      fileName: `${name}.csv`,
      bytes,
      name,
      options: { geometry, seek, alpha },
      device,
      firmware,
      group,
      keepsKinks: kinks === 'keep'
    });
    if (!saved.ok) {
      const refused = uploadRefusal(saved);
      if (saved.reason === 'too-large') refused.title = 'Site-resolved shots take 4 MB at most.';
      if (saved.reason === 'unreadable') refused.title = 'The shots cannot be read. Nothing was saved.';
      return { refused };
    }
    const found = readSiteMap(db, actor, saved.id);
    if (!found.ok) return { refused: NOT_HERE };
    const body = JSON.stringify({ ...found.map, createdAt: isoMoment(found.map.createdAt) });
    return { done: { status: 201, location: `/api/v1/site-maps/${saved.id}`, body } };
  });
};
