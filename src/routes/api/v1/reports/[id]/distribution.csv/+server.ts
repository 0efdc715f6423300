import { distributionCsv } from '$lib/model/exports/distribution-csv';
import { askToken } from '../../../../../ask-token';
import { csvOfReport } from '../../../../csv-of-report';
import type { RequestHandler } from './$types';

/** The distribution of a report as CSV, a row a count. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  return asked.ok ? csvOfReport(event, asked, 'distribution', distributionCsv) : asked.response;
};
