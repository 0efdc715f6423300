import { linkOptionsSchema } from '$lib/model/link/link-options';
import type { Actor } from '$lib/server/services/access/actor';
import { linkVisits } from '$lib/server/services/links/link-visits';
import type { Opens } from '$lib/server/services/links/linkable';
import { listLinks } from '$lib/server/services/links/list-links';
import { mailLink } from '$lib/server/services/links/mail-link';
import { makeLink } from '$lib/server/services/links/make-link';
import { revokeLink } from '$lib/server/services/links/revoke-link';
import { json, type RequestEvent } from '@sveltejs/kit';
import { readJson } from './datasets/read-json';
import { linkRefusal } from './link-refusal';

const NOT_KEPT = { 'cache-control': 'no-store' };

/** Links to a report or a sweep: `{links: TeamLink[]}`, for those who may make them. */
export function tellLinks(event: RequestEvent, actor: Actor, opens: Opens): Response {
  const listed = listLinks(event.locals.db, actor, opens);
  return listed.ok ? json({ links: listed.links }, { headers: NOT_KEPT }) : linkRefusal(listed.reason);
}

/** Makes a link: LinkOptions gives `{id, address, missed}`; the address is told this once, `missed` got no mail. */
export async function makeLinkTo(
  event: RequestEvent,
  asked: { actor: Actor; team: { name: string } },
  opens: Opens
): Promise<Response> {
  const read = await readJson(event.request, linkOptionsSchema);
  if (!read.ok) return read.response;
  const { db, person } = event.locals;
  const made = makeLink(db, asked.actor, opens, read.body);
  if (!made.ok) return linkRefusal(made.reason);
  const address = `${event.url.origin}/link/${made.token}`;
  const thing = 'sweep' in opens ? 'sweep' : 'report';
  const from = person?.name ?? 'Somebody';
  const missed =
    read.body.audience === 'named'
      ? await mailLink(db, { ...read.body, opens: thing, address, team: asked.team.name, from })
      : [];
  return json({ id: made.id, address, missed }, { status: 201, headers: NOT_KEPT });
}

/** The log of a link: `{visits: LinkVisit[]}`, the newest first. */
export function tellVisits(event: RequestEvent, actor: Actor, opens: Opens, link: string): Response {
  const listed = linkVisits(event.locals.db, actor, opens, link);
  return listed.ok ? json({ visits: listed.visits }, { headers: NOT_KEPT }) : linkRefusal(listed.reason);
}

/** Closes a link for good. */
export function closeLink(event: RequestEvent, actor: Actor, opens: Opens, link: string): Response {
  const revoked = revokeLink(event.locals.db, actor, opens, link);
  return revoked.ok ? new Response(null, { status: 204 }) : linkRefusal(revoked.reason);
}
