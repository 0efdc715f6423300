import { siteMapTable } from '$lib/charts/site-map-table';
import { tableToCsv } from '$lib/charts/table-to-csv';
import { openSiteMap } from '$lib/server/services/site-maps/open-site-map';
import { askTeamJson } from '../../../../../../ask-json';
import { problem } from '../../../../../../problem';
import { attachment } from '../../../datasets/attachment';
import type { RequestHandler } from './$types';

/** The pairs of a map of sites, a line each: what the chart's table holds. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const read = openSiteMap(event.locals.db, asked.actor, event.params.id);
  if (!read.ok || !read.document)
    return problem({ status: 404, code: 'not-found', title: 'There is nothing at this address.' });
  const csv = tableToCsv(siteMapTable(read.document));
  return attachment(csv, `${read.map.name}.csv`, 'text/csv; charset=utf-8');
};
