import { documentCsv } from '$lib/model/document-csv';
import { readReport } from '$lib/server/services/reports/read-report';
import { askTeamJson } from '../../../../../../ask-json';
import { problem } from '../../../../../../problem';
import { attachment } from '../../../datasets/attachment';
import type { RequestHandler } from './$types';

/** Every number of a report as a CSV file. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const read = readReport(event.locals.db, asked.actor, event.params.id);
  if (!read.ok)
    return problem({ status: 404, code: 'not-found', title: 'There is nothing at this address.' });
  const { number, conditions } = read.report;
  if (!read.document.ok)
    return problem({
      status: 500,
      code: 'unreadable',
      title: `The document of report ${number} cannot be read: ${read.document.problem}.`,
      detail: 'Its bytes are kept: take them as JSON.'
    });
  const csv = documentCsv(read.document.diagnosis);
  return attachment(csv, `${conditions.name}, report ${number}.csv`, 'text/csv; charset=utf-8');
};
