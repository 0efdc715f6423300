import { makeTeamForm } from '$lib/model/team/make-team-form';
import { makeTeam } from '$lib/server/services/teams/make-team';
import { myTeams } from '$lib/server/services/teams/my-teams';
import { redirect } from '@sveltejs/kit';
import { fail, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { askPerson } from '../../ask';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async (event) => {
  const person = askPerson(event);
  return { teams: myTeams(event.locals.db, person.id), form: await superValidate(zod4(makeTeamForm)) };
};

export const actions: Actions = {
  default: async (event) => {
    const person = askPerson(event);
    const form = await superValidate(await event.request.formData(), zod4(makeTeamForm));
    if (!form.valid) return fail(400, { form });
    const made = makeTeam(event.locals.db, person.id, form.data);
    if (made.ok) redirect(303, `/team/${made.team.slug}`);
    if (made.reason === 'taken')
      return setError(form, 'slug', `/team/${made.slug} is in use. Type another word for the address.`);
    if (made.reason === 'reserved')
      return setError(form, 'slug', `/team/${made.slug} is kept for the program. Type another word.`);
    return setError(form, 'slug', 'The name has too few Latin letters for an address. Type one here.');
  }
};
