import { bundleOfReport } from '$lib/server/services/reports/bundle-of-report';
import { askTeamJson } from '../../../../../../ask-json';
import { problem } from '../../../../../../problem';
import { unreadable } from '../../../../../../unreadable';
import { zipOfReport } from '../../../../../../zip-of-report';
import { attachment } from '../../../datasets/attachment';
import type { RequestHandler } from './$types';

/** Everything about a report as a zip. */
export const GET: RequestHandler = async (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const address = `${event.url.origin}/team/${asked.team.slug}/reports/${event.params.id}`;
  const made = await bundleOfReport(event.locals.db, asked.actor, event.params.id, address);
  if (made.ok) return attachment(zipOfReport(made), `${made.name}.zip`, 'application/zip');
  if (made.reason === 'unreadable') return unreadable(made.problem);
  return problem({ status: 404, code: 'not-found', title: 'There is nothing at this address.' });
};
