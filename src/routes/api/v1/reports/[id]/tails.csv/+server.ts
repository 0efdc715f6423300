import { tailsCsv } from '$lib/model/exports/tails-csv';
import { askToken } from '../../../../../ask-token';
import { csvOfReport } from '../../../../csv-of-report';
import type { RequestHandler } from './$types';

/** Both tails of a report as CSV, a row a tail. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  return asked.ok ? csvOfReport(event, asked, 'tails', tailsCsv) : asked.response;
};
