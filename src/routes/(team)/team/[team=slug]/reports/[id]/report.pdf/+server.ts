import { pdfOfReport } from '$lib/server/services/reports/pdf-of-report';
import { askTeamJson } from '../../../../../../ask-json';
import { problem } from '../../../../../../problem';
import { attachment } from '../../../datasets/attachment';
import type { RequestHandler } from './$types';

/** A report for print. */
export const GET: RequestHandler = async (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const address = `${event.url.origin}/team/${asked.team.slug}/reports/${event.params.id}`;
  const made = await pdfOfReport(event.locals.db, asked.actor, event.params.id, address);
  if (made.ok) return attachment(made.bytes, `${made.name}.pdf`, 'application/pdf');
  if (made.reason === 'unknown')
    return problem({ status: 404, code: 'not-found', title: 'There is nothing at this address.' });
  return problem({
    status: 500,
    code: 'unreadable',
    title: `The document of this report cannot be read: ${made.problem}.`,
    detail: 'Its bytes are kept: take them as JSON.'
  });
};
