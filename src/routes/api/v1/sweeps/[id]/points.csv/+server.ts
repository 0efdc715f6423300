import { sweepTable } from '$lib/charts/sweep-table';
import { tableToCsv } from '$lib/charts/table-to-csv';
import { readSweep } from '$lib/server/services/sweeps/read-sweep';
import { attachment } from '../../../../../(team)/team/[team=slug]/datasets/attachment';
import { askToken } from '../../../../../ask-token';
import { problem } from '../../../../../problem';
import { damaged, NOT_HERE } from '../../../../answers';
import type { RequestHandler } from './$types';

/** The points of a sweep: cumulants, ratios and intervals, a line each. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readSweep(event.locals.db, asked.actor, event.params.id);
  if (!read.ok) return problem(NOT_HERE);
  if (!read.document) return problem(damaged('its bytes do not have their sha256', 'sweep'));
  const csv = tableToCsv(sweepTable(read.document));
  return attachment(csv, `${read.sweep.name}.csv`, 'text/csv; charset=utf-8');
};
