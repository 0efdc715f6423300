import { documentCsv } from '$lib/model/document-csv';
import { askToken } from '../../../../../ask-token';
import { csvOfReport } from '../../../../csv-of-report';
import type { RequestHandler } from './$types';

/** Every number of a report as CSV. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  return asked.ok ? csvOfReport(event, asked, '', documentCsv) : asked.response;
};
