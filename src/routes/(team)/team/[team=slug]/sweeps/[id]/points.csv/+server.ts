import { sweepTable } from '$lib/charts/sweep-table';
import { tableToCsv } from '$lib/charts/table-to-csv';
import { readSweep } from '$lib/server/services/sweeps/read-sweep';
import { askTeamJson } from '../../../../../../ask-json';
import { problem } from '../../../../../../problem';
import { attachment } from '../../../datasets/attachment';
import type { RequestHandler } from './$types';

/** The points of a sweep: cumulants, ratios and intervals, a line each. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const read = readSweep(event.locals.db, asked.actor, event.params.id);
  if (!read.ok || !read.document)
    return problem({ status: 404, code: 'not-found', title: 'There is nothing at this address.' });
  return attachment(
    tableToCsv(sweepTable(read.document)),
    `${read.sweep.name}.csv`,
    'text/csv; charset=utf-8'
  );
};
