import { linkVisits } from '$lib/server/services/links/link-visits';
import { revokeLink } from '$lib/server/services/links/revoke-link';
import { json } from '@sveltejs/kit';
import { askTeamJson } from '../../../../../../../ask-json';
import { linkRefusal } from '../link-refusal';
import type { RequestHandler } from './$types';

/** The log of a link: `{visits: LinkVisit[]}`, the newest first. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const { id, link } = event.params;
  const listed = linkVisits(event.locals.db, asked.actor, { report: id }, link);
  if (!listed.ok) return linkRefusal(listed.reason);
  return json({ visits: listed.visits }, { headers: { 'cache-control': 'no-store' } });
};

/** Closes a link for good. */
export const DELETE: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const { id, link } = event.params;
  const revoked = revokeLink(event.locals.db, asked.actor, { report: id }, link);
  return revoked.ok ? new Response(null, { status: 204 }) : linkRefusal(revoked.reason);
};
