import { askTeamJson } from '../../../../../../ask-json';
import { makeLinkTo, tellLinks } from '../../../link-answers';
import type { RequestHandler } from './$types';

/** Links of a sweep. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  return asked.ok ? tellLinks(event, asked.actor, { sweep: event.params.id }) : asked.response;
};

/** Makes a link to a sweep. */
export const POST: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  return asked.ok ? makeLinkTo(event, asked, { sweep: event.params.id }) : asked.response;
};
