import { changePasswordForm, nameForm } from '$lib/model/account/sign-in';
import { beginSession, endSession } from '$lib/server/auth/begin-session';
import { clientOf } from '$lib/server/auth/client-of';
import { account } from '$lib/server/services/accounts/account';
import { renamePerson, signOutEverywhere, untieIdentity } from '$lib/server/services/accounts/change-account';
import { changePassword } from '$lib/server/services/accounts/change-password';
import { waysIn } from '$lib/server/services/accounts/ways-in';
import { myTeams } from '$lib/server/services/teams/my-teams';
import { redirect } from '@sveltejs/kit';
import { fail, message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { askPerson } from '../../ask';
import { ISSUER_REFUSALS, waitFor } from '../refusals';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async (event) => {
  const { id } = askPerson(event);
  const mine = account(event.locals.db, id);
  if (!mine) redirect(303, '/sign-in');
  return {
    account: mine,
    teams: myTeams(event.locals.db, id),
    ways: waysIn(),
    problem: ISSUER_REFUSALS[event.url.searchParams.get('problem') ?? ''] ?? null,
    nameForm: await superValidate({ name: mine.name }, zod4(nameForm)),
    passwordForm: await superValidate(zod4(changePasswordForm))
  };
};

export const actions: Actions = {
  name: async (event) => {
    const { id } = askPerson(event);
    const form = await superValidate(await event.request.formData(), zod4(nameForm));
    if (!form.valid) return fail(400, { form });
    renamePerson(event.locals.db, id, form.data.name);
    return message(form, 'Your name is changed.');
  },
  password: async (event) => {
    const { id } = askPerson(event);
    const form = await superValidate(await event.request.formData(), zod4(changePasswordForm));
    const { old, password } = form.data;
    form.data = { old: '', password: '' };
    if (!form.valid) return fail(400, { form });
    const changed = await changePassword(event.locals.db, id, { old, password }, clientOf(event));
    if (changed.ok) {
      await beginSession(event, id);
      return message(form, 'Your password is changed, and every other browser is signed out.');
    }
    if (changed.reason === 'wait')
      return setError(form, '', waitFor(event, changed.seconds), { status: 429 });
    if (changed.reason === 'weak') return setError(form, 'password', changed.why);
    return setError(form, 'old', 'This is not your password.');
  },
  untie: async (event) => {
    const { id } = askPerson(event);
    const given = await event.request.formData();
    const text = (name: string) => String(given.get(name) ?? '');
    untieIdentity(event.locals.db, id, { issuer: text('issuer'), subject: text('subject') });
    redirect(303, '/account');
  },
  everywhere: async (event) => {
    const { id } = askPerson(event);
    signOutEverywhere(event.locals.db, id);
    await endSession(event);
    redirect(303, '/');
  }
};
