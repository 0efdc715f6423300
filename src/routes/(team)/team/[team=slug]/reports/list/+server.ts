import { readReportQuery } from '$lib/model/team/reports/report-query';
import { listReports } from '$lib/server/services/reports/list-reports';
import { json } from '@sveltejs/kit';
import { askTeamJson } from '../../../../../ask-json';
import type { RequestHandler } from './$types';

/** One page of the table: the query of the page's own address gives ReportList as JSON. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const list = listReports(event.locals.db, asked.actor, readReportQuery(event.url.searchParams));
  return json(list, { headers: { 'cache-control': 'no-store' } });
};
