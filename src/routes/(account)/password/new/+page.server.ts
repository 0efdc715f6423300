import { newPasswordForm } from '$lib/model/account/sign-in';
import { beginSession } from '$lib/server/auth/begin-session';
import { ownPath } from '$lib/server/auth/own-path';
import { findMailedToken } from '$lib/server/services/accounts/mailed-token';
import { resetPassword } from '$lib/server/services/accounts/reset-password';
import { redirect } from '@sveltejs/kit';
import { fail, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { openToAll } from '../../../ask';
import { LINK_REFUSALS } from '../../refusals';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url, setHeaders }) => {
  openToAll();
  setHeaders({ 'cache-control': 'no-store' });
  const found = findMailedToken(locals.db, 'password', url.searchParams.get('token') ?? '');
  return {
    form: await superValidate(zod4(newPasswordForm)),
    email: found.ok ? found.email : null,
    problem: found.ok ? null : LINK_REFUSALS[found.reason]
  };
};

export const actions: Actions = {
  default: async (event) => {
    openToAll();
    const form = await superValidate(await event.request.formData(), zod4(newPasswordForm));
    const { password } = form.data;
    form.data.password = '';
    if (!form.valid) return fail(400, { form });
    const token = event.url.searchParams.get('token') ?? '';
    const reset = await resetPassword(event.locals.db, { token, password });
    if (!reset.ok && reset.reason === 'weak') return setError(form, 'password', reset.why);
    if (!reset.ok) return setError(form, '', LINK_REFUSALS[reset.reason]);
    await beginSession(event, reset.personId);
    redirect(303, ownPath(event.url.searchParams.get('then')));
  }
};
