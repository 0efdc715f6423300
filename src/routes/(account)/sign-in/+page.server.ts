import { signInForm } from '$lib/model/account/sign-in';
import { beginSession } from '$lib/server/auth/begin-session';
import { ownPath } from '$lib/server/auth/own-path';
import { checkPassword } from '$lib/server/services/accounts/check-password';
import { redirect } from '@sveltejs/kit';
import { fail, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { openToAll } from '../../ask';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url }) => {
  openToAll();
  const then = ownPath(url.searchParams.get('then'));
  if (locals.person) redirect(303, then);
  return { form: await superValidate(zod4(signInForm)) };
};

export const actions: Actions = {
  default: async (event) => {
    openToAll();
    const form = await superValidate(await event.request.formData(), zod4(signInForm));
    const { email, password } = form.data;
    // Whatever is wrong, the page that comes back holds no password.
    form.data.password = '';
    if (!form.valid) return fail(400, { form });
    const checked = await checkPassword(event.locals.db, { email, password });
    if (!checked.ok) return setError(form, 'password', 'Address and password do not fit together.');
    await beginSession(event, checked.personId);
    redirect(303, ownPath(event.url.searchParams.get('then')));
  }
};
