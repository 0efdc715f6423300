import { askTeamJson } from '../../../../../../ask-json';
import { makeLinkTo, tellLinks } from '../../../link-answers';
import type { RequestHandler } from './$types';

/** Links of a report. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  return asked.ok ? tellLinks(event, asked.actor, { report: event.params.id }) : asked.response;
};

/** Makes a link to a report. */
export const POST: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  return asked.ok ? makeLinkTo(event, asked, { report: event.params.id }) : asked.response;
};
