import { documentCsv } from '$lib/model/document-csv';
import { readReport } from '$lib/server/services/reports/read-report';
import { attachment } from '../../../../../(team)/team/[team=slug]/datasets/attachment';
import { askToken } from '../../../../../ask-token';
import { problem } from '../../../../../problem';
import { damaged, NOT_HERE } from '../../../../answers';
import type { RequestHandler } from './$types';

/** Every number of a report as CSV. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readReport(event.locals.db, asked.actor, event.params.id);
  if (!read.ok) return problem(NOT_HERE);
  if (!read.document.ok) return problem(damaged(read.document.problem));
  const { number, conditions } = read.report;
  const csv = documentCsv(read.document.diagnosis);
  return attachment(csv, `${conditions.name}, report ${number}.csv`, 'text/csv; charset=utf-8');
};
