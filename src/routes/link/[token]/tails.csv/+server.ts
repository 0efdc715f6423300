import { tailsCsv } from '$lib/model/exports/tails-csv';
import { askLinkJson } from '../../../ask-link';
import { linkCsv } from '../link-file';
import type { RequestHandler } from './$types';

/** Both tails as a CSV file, where the link shows the counts. */
export const GET: RequestHandler = (event) => {
  const asked = askLinkJson(event, 'see');
  return asked.ok ? linkCsv(asked.view, 'tails', tailsCsv) : asked.response;
};
