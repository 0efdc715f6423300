import { readReport } from '$lib/server/services/reports/read-report';
import { askTeamJson } from '../../../../../../ask-json';
import { problem } from '../../../../../../problem';
import { attachment } from '../../../datasets/attachment';
import type { RequestHandler } from './$types';

/** The diagnosis document of a report, byte for byte as it was stored, readable or not. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const read = readReport(event.locals.db, asked.actor, event.params.id);
  if (!read.ok)
    return problem({ status: 404, code: 'not-found', title: 'There is nothing at this address.' });
  const { text, number, conditions } = read.report;
  return attachment(text, `${conditions.name}, report ${number}.json`, 'application/json');
};
