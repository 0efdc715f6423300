import { FILE_COST } from '$lib/server/auth/request-limits';
import { pdfOfReport } from '$lib/server/services/reports/pdf-of-report';
import { attachment } from '../../../../../(team)/team/[team=slug]/datasets/attachment';
import { askToken } from '../../../../../ask-token';
import { problem } from '../../../../../problem';
import { damaged, NOT_HERE } from '../../../../answers';
import type { RequestHandler } from './$types';

/** A report for print. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read', FILE_COST);
  if (!asked.ok) return asked.response;
  // Where people read it: the same bytes as the page gives.
  const address = `${event.url.origin}/team/${asked.team.slug}/reports/${event.params.id}`;
  const made = await pdfOfReport(event.locals.db, asked.actor, event.params.id, address);
  if (made.ok) return attachment(made.bytes, `${made.name}.pdf`, 'application/pdf');
  return problem(made.reason === 'unknown' ? NOT_HERE : damaged(made.problem));
};
