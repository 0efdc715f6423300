import { pdfOfSweep } from '$lib/server/services/sweeps/pdf-of-sweep';
import { askTeamJson } from '../../../../../../ask-json';
import { problem } from '../../../../../../problem';
import { attachment } from '../../../datasets/attachment';
import type { RequestHandler } from './$types';

/** A sweep for print. */
export const GET: RequestHandler = async (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const address = `${event.url.origin}/team/${asked.team.slug}/sweeps/${event.params.id}`;
  const made = await pdfOfSweep(event.locals.db, asked.actor, event.params.id, address);
  if (made.ok) return attachment(made.bytes, `${made.name}.pdf`, 'application/pdf');
  if (made.reason === 'damaged')
    return problem({
      status: 500,
      code: 'unreadable',
      title: 'The bytes of this sweep no longer have the sha256 that was noted when it was made.',
      detail: 'They are kept: take them as JSON.'
    });
  return problem({ status: 404, code: 'not-found', title: 'There is nothing at this address.' });
};
