import { pdfOfReport } from '$lib/server/services/reports/pdf-of-report';
import { askTeamJson } from '../../../../../../ask-json';
import { problem } from '../../../../../../problem';
import { unreadable } from '../../../../../../unreadable';
import { attachment } from '../../../datasets/attachment';
import type { RequestHandler } from './$types';

/** A report for print. */
export const GET: RequestHandler = async (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const address = `${event.url.origin}/team/${asked.team.slug}/reports/${event.params.id}`;
  const made = await pdfOfReport(event.locals.db, asked.actor, event.params.id, address);
  if (made.ok) return attachment(made.bytes, `${made.name}.pdf`, 'application/pdf');
  if (made.reason === 'unreadable') return unreadable(made.problem);
  return problem({ status: 404, code: 'not-found', title: 'There is nothing at this address.' });
};
