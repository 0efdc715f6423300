import { FILE_COST } from '$lib/server/auth/request-limits';
import { pdfOfSweep } from '$lib/server/services/sweeps/pdf-of-sweep';
import { attachment } from '../../../../../(team)/team/[team=slug]/datasets/attachment';
import { askToken } from '../../../../../ask-token';
import { problem } from '../../../../../problem';
import { damaged, NOT_HERE } from '../../../../answers';
import type { RequestHandler } from './$types';

/** A sweep for print: the same bytes as its page gives. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read', FILE_COST);
  if (!asked.ok) return asked.response;
  const address = `${event.url.origin}/team/${asked.team.slug}/sweeps/${event.params.id}`;
  const made = await pdfOfSweep(event.locals.db, asked.actor, event.params.id, address);
  if (made.ok) return attachment(made.bytes, `${made.name}.pdf`, 'application/pdf');
  return problem(
    made.reason === 'unknown' ? NOT_HERE : damaged('its bytes do not have their sha256', 'sweep')
  );
};
