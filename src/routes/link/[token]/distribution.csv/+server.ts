import { distributionCsv } from '$lib/model/exports/distribution-csv';
import { askLinkJson } from '../../../ask-link';
import { linkCsv } from '../link-file';
import type { RequestHandler } from './$types';

/** The distribution as a CSV file, where the link shows the counts. */
export const GET: RequestHandler = (event) => {
  const asked = askLinkJson(event, 'see');
  return asked.ok ? linkCsv(asked.view, 'distribution', distributionCsv) : asked.response;
};
