import { distributionCsv } from '$lib/model/exports/distribution-csv';
import { askTeamJson } from '../../../../../../ask-json';
import { csvOfReport } from '../csv-of-report';
import type { RequestHandler } from './$types';

/** The distribution of a report as a CSV file, a row a count. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  return csvOfReport(event, asked.actor, 'distribution', distributionCsv);
};
