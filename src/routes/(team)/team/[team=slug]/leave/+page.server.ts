import { removeMember } from '$lib/server/services/teams/remove-member';
import { fail, redirect } from '@sveltejs/kit';
import { askTeam } from '../../../../ask';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = (event) => {
  askTeam(event, 'see');
};

export const actions: Actions = {
  default: (event) => {
    const { actor } = askTeam(event, 'see');
    const left = removeMember(event.locals.db, actor, actor.personId);
    if (left.ok || left.reason === 'unknown') redirect(303, '/teams');
    return fail(409, {
      problem: 'You are its last lead. Make somebody else a lead first; the team would have none.'
    });
  }
};
