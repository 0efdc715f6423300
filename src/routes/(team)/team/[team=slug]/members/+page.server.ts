import { inviteSchema } from '$lib/model/team/members/invite';
import { ROLE_WORDS } from '$lib/model/team/members/role-words';
import { ROLES, type Role } from '$lib/model/team/roles';
import { invitations } from '$lib/server/services/invitations/invitations';
import { invite } from '$lib/server/services/invitations/invite';
import { resendInvitation } from '$lib/server/services/invitations/resend-invitation';
import { revokeInvitation } from '$lib/server/services/invitations/revoke-invitation';
import { changeRole } from '$lib/server/services/teams/change-role';
import { members } from '$lib/server/services/teams/members';
import { removeMember } from '$lib/server/services/teams/remove-member';
import { fail, redirect } from '@sveltejs/kit';
import { message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { askTeam } from '../../../../ask';
import type { Actions, PageServerLoad } from './$types';
import { afterMail, INVITE_REFUSALS, LAST_LEAD, NOT_HERE } from './words';

export const load: PageServerLoad = async (event) => {
  const { actor } = askTeam(event, 'manage');
  const { db } = event.locals;
  return {
    members: members(db, actor),
    invitations: invitations(db, actor),
    me: actor.personId,
    form: await superValidate(zod4(inviteSchema))
  };
};

const addressIn =
  ({ origin }: URL) =>
  (token: string) =>
    `${origin}/invitation/${token}`;

export const actions: Actions = {
  invite: async (event) => {
    const { actor } = askTeam(event, 'manage');
    const form = await superValidate(await event.request.formData(), zod4(inviteSchema));
    if (!form.valid) return fail(400, { form });
    const made = await invite(event.locals.db, actor, form.data, addressIn(event.url));
    if (!made.ok) return setError(form, 'email', INVITE_REFUSALS[made.reason]);
    return message(form, afterMail(form.data.email, made));
  },
  role: async (event) => {
    const { actor, team } = askTeam(event, 'manage');
    const data = await event.request.formData();
    const [personId, role] = [String(data.get('person')), String(data.get('role')) as Role];
    if (!ROLES.includes(role)) return fail(400, { problem: 'There is no such role.' });
    const done = changeRole(event.locals.db, actor, personId, role);
    if (!done.ok)
      return fail(done.reason === 'last-lead' ? 409 : 404, {
        problem: done.reason === 'last-lead' ? LAST_LEAD : NOT_HERE
      });
    // Who lowered themselves may not see this page any more.
    if (personId === actor.personId && role !== 'lead') redirect(303, `/team/${team.slug}`);
    return { told: `Changed: now ${ROLE_WORDS[role].article}.` };
  },
  remove: async (event) => {
    const { actor } = askTeam(event, 'manage');
    const personId = String((await event.request.formData()).get('person'));
    const done = removeMember(event.locals.db, actor, personId);
    if (!done.ok)
      return fail(done.reason === 'last-lead' ? 409 : 404, {
        problem: done.reason === 'last-lead' ? LAST_LEAD : NOT_HERE
      });
    if (personId === actor.personId) redirect(303, '/teams');
    return { told: 'Removed. Their access has ended.' };
  },
  resend: async (event) => {
    const { actor } = askTeam(event, 'manage');
    const id = String((await event.request.formData()).get('invitation'));
    const sent = await resendInvitation(event.locals.db, actor, id, addressIn(event.url));
    if (sent.ok) return afterMail(sent.email, sent);
    if (sent.reason === 'unknown') return fail(404, { problem: NOT_HERE });
    return fail(429, { problem: 'The last mail went less than a minute ago. Give it time to arrive.' });
  },
  revoke: async (event) => {
    const { actor } = askTeam(event, 'manage');
    const id = String((await event.request.formData()).get('invitation'));
    const ended = revokeInvitation(event.locals.db, actor, id);
    if (ended.ok) return { told: `The invitation to ${ended.email} opens nothing any more.` };
    if (ended.reason === 'unknown') return fail(404, { problem: NOT_HERE });
    return fail(409, { problem: 'It was accepted meanwhile: remove the member instead.' });
  }
};
