import { askTeamJson } from '../../../../../../../ask-json';
import { closeLink, tellVisits } from '../../../../link-answers';
import type { RequestHandler } from './$types';

/** The log of a link to a sweep. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  const { id, link } = event.params;
  return asked.ok ? tellVisits(event, asked.actor, { sweep: id }, link) : asked.response;
};

/** Closes a link to a sweep for good. */
export const DELETE: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  const { id, link } = event.params;
  return asked.ok ? closeLink(event, asked.actor, { sweep: id }, link) : asked.response;
};
