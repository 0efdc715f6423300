import { documentCsv } from '$lib/model/document-csv';
import { askTeamJson } from '../../../../../../ask-json';
import { csvOfReport } from '../csv-of-report';
import type { RequestHandler } from './$types';

/** Every number of a report as a CSV file. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  return csvOfReport(event, asked.actor, '', documentCsv);
};
