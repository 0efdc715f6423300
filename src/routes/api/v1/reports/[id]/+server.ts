import { reportSchema } from '$lib/model/api/shapes/report';
import { toReport } from '$lib/model/api/to-report';
import { readReport } from '$lib/server/services/reports/read-report';
import { askToken } from '../../../../ask-token';
import { problem } from '../../../../problem';
import { NOT_HERE, told } from '../../../answers';
import type { RequestHandler } from './$types';

/** A report: its answer, conditions and options, and where its files are. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readReport(event.locals.db, asked.actor, event.params.id);
  if (!read.ok) return problem(NOT_HERE);
  const { report, document } = read;
  const statement = document.ok ? document.diagnosis.answer.statement : null;
  return told(reportSchema, toReport(report, statement, `/api/v1/reports/${report.id}`));
};
