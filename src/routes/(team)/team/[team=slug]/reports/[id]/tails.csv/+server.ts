import { tailsCsv } from '$lib/model/exports/tails-csv';
import { askTeamJson } from '../../../../../../ask-json';
import { csvOfReport } from '../csv-of-report';
import type { RequestHandler } from './$types';

/** Both tails of a report as a CSV file, a row a tail. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  return csvOfReport(event, asked.actor, 'tails', tailsCsv);
};
