import { readReport } from '$lib/server/services/reports/read-report';
import { attachment } from '../../../../../(team)/team/[team=slug]/datasets/attachment';
import { askToken } from '../../../../../ask-token';
import { problem } from '../../../../../problem';
import { NOT_HERE } from '../../../../answers';
import type { RequestHandler } from './$types';

/** The diagnosis document, byte for byte as it was stored, readable or not. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readReport(event.locals.db, asked.actor, event.params.id);
  if (!read.ok) return problem(NOT_HERE);
  const { text, number, conditions } = read.report;
  return attachment(text, `${conditions.name}, report ${number}.json`, 'application/json');
};
