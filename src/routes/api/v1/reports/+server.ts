import { reportPageSchema, reportsQuery } from '$lib/model/api/operations/reports';
import { isoMoment } from '$lib/model/api/shapes/moment';
import { pageOfReports } from '$lib/server/services/reports/page-of-reports';
import { askToken } from '../../../ask-token';
import { problem } from '../../../problem';
import { BAD_CURSOR, nextPage, readQuery, told } from '../../answers';
import type { RequestHandler } from './$types';

/** A page of the team's reports. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readQuery(event.url, reportsQuery);
  if (!read.ok) return read.response;
  const found = pageOfReports(event.locals.db, asked.actor, read.query);
  if (!found.ok) return problem(BAD_CURSOR);
  const { entries, next } = found.page;
  const data = entries.map((entry) => ({ ...entry, createdAt: isoMoment(entry.createdAt) }));
  return told(reportPageSchema, { data, next }, { headers: nextPage(event.url, next) });
};
