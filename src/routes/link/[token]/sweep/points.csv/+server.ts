import { sweepTable } from '$lib/charts/sweep-table';
import { tableToCsv } from '$lib/charts/table-to-csv';
import { askLinkSweepJson } from '../../../../ask-link';
import { unreadable } from '../../../../unreadable';
import { linkFile } from '../../link-file';
import type { RequestHandler } from './$types';

/** The points of the sweep that the link shows, a line each. */
export const GET: RequestHandler = (event) => {
  const asked = askLinkSweepJson(event);
  if (!asked.ok) return asked.response;
  const { document, fileName } = asked.view;
  if (document === null) return unreadable('its bytes do not have their sha256', 'sweep');
  const csv = tableToCsv(sweepTable(JSON.parse(document) as Parameters<typeof sweepTable>[0]));
  return linkFile(csv, `${fileName}.csv`, 'text/csv; charset=utf-8', 'sweep');
};
