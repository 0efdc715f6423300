import { signInForm } from '$lib/model/account/sign-in';
import { beginSession } from '$lib/server/auth/begin-session';
import { clientOf } from '$lib/server/auth/client-of';
import { ownPath } from '$lib/server/auth/own-path';
import { addressInvited } from '$lib/server/services/invitations/address-invited';
import { checkPassword } from '$lib/server/services/accounts/check-password';
import { waysIn } from '$lib/server/services/accounts/ways-in';
import { redirect } from '@sveltejs/kit';
import { fail, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { openToAll } from '../../ask';
import { ISSUER_REFUSALS, waitFor } from '../refusals';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url }) => {
  openToAll();
  const then = ownPath(url.searchParams.get('then'));
  // Auth.js comes here with `error` when the visit to an issuer failed; identify's reasons come as `problem`.
  const reason = url.searchParams.has('error') ? 'failed' : (url.searchParams.get('problem') ?? '');
  if (locals.person) redirect(303, reason ? `/account?problem=${encodeURIComponent(reason)}` : then);
  return {
    form: await superValidate({ email: addressInvited(locals.db, then) }, zod4(signInForm), {
      errors: false
    }),
    ways: waysIn(),
    then,
    problem: ISSUER_REFUSALS[reason] ?? null
  };
};

export const actions: Actions = {
  default: async (event) => {
    openToAll();
    const form = await superValidate(await event.request.formData(), zod4(signInForm));
    const { email, password } = form.data;
    // Whatever is wrong, the page that comes back holds no password.
    form.data.password = '';
    if (!form.valid) return fail(400, { form });
    const checked = await checkPassword(event.locals.db, { email, password }, clientOf(event));
    if (!checked.ok && checked.reason === 'wait')
      return setError(form, '', waitFor(event, checked.seconds), { status: 429 });
    if (!checked.ok) return setError(form, 'password', 'Address and password do not fit together.');
    await beginSession(event, checked.personId);
    redirect(303, ownPath(event.url.searchParams.get('then')));
  }
};
