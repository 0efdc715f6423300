import { linkOptionsSchema } from '$lib/model/link/link-options';
import { listLinks } from '$lib/server/services/links/list-links';
import { mailLink } from '$lib/server/services/links/mail-link';
import { makeLink } from '$lib/server/services/links/make-link';
import { json } from '@sveltejs/kit';
import { askTeamJson } from '../../../../../../ask-json';
import { readJson } from '../../../datasets/read-json';
import { linkRefusal } from '../../../reports/[id]/links/link-refusal';
import type { RequestHandler } from './$types';

const NOT_KEPT = { 'cache-control': 'no-store' };

/** Links of a sweep: `{links: TeamLink[]}`, for those who may make them. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const listed = listLinks(event.locals.db, asked.actor, { sweep: event.params.id });
  return listed.ok ? json({ links: listed.links }, { headers: NOT_KEPT }) : linkRefusal(listed.reason);
};

/** Makes a link: LinkOptions gives `{id, address, missed}`; the address is told this once, `missed` got no mail. */
export const POST: RequestHandler = async (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const read = await readJson(event.request, linkOptionsSchema);
  if (!read.ok) return read.response;
  const { actor, team } = asked;
  const { db, person } = event.locals;
  const made = makeLink(db, actor, { sweep: event.params.id }, read.body);
  if (!made.ok) return linkRefusal(made.reason);
  const address = `${event.url.origin}/link/${made.token}`;
  const missed =
    read.body.audience === 'named'
      ? await mailLink(db, {
          ...read.body,
          opens: 'sweep',
          address,
          team: team.name,
          from: person?.name ?? 'Somebody'
        })
      : [];
  return json({ id: made.id, address, missed }, { status: 201, headers: NOT_KEPT });
};
