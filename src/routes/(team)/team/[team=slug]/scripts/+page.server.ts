import { tokenFormSchema } from '$lib/model/api/token-form';
import { listTokens } from '$lib/server/services/tokens/list-tokens';
import { makeToken } from '$lib/server/services/tokens/make-token';
import { revokeToken } from '$lib/server/services/tokens/revoke-token';
import { error, fail } from '@sveltejs/kit';
import { message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { askTeam } from '../../../../ask';
import type { Actions, PageServerLoad } from './$types';

/** Everybody may have tokens of their own; the service shows and ends no others, except for leads. */
const own = ({ locals }: { locals: App.Locals }) => ({ createdBy: locals.person?.id ?? null });

export const load: PageServerLoad = async (event) => {
  const { actor } = askTeam(event, 'script', own(event));
  return {
    tokens: listTokens(event.locals.db, actor),
    origin: event.url.origin,
    form: await superValidate({ scopes: ['read' as const] }, zod4(tokenFormSchema), { errors: false })
  };
};

export const actions: Actions = {
  make: async (event) => {
    const { actor } = askTeam(event, 'script', own(event));
    const form = await superValidate(await event.request.formData(), zod4(tokenFormSchema));
    if (!form.valid) return fail(400, { form });
    const made = makeToken(event.locals.db, actor, form.data);
    // The page that shows a token is for nobody's cache: withPerson says so for everybody signed in.
    if (made.ok) return message(form, { token: made.token, name: form.data.name });
    if (made.reason === 'above-you')
      return setError(form, 'role', 'A token may not be more than you are in this team.');
    if (made.reason === 'too-many')
      return setError(form, 'name', 'This team has 100 tokens open. Revoke some first.', { status: 409 });
    error(403, { message: 'Your role in this team does not allow that.', code: 'not-allowed' });
  },
  revoke: async (event) => {
    const { actor } = askTeam(event, 'script', own(event));
    const id = String((await event.request.formData()).get('token'));
    const done = revokeToken(event.locals.db, actor, id);
    if (!done.ok) return fail(404, { problem: 'There is no such token here.' });
    return { told: `“${done.name}” is revoked: it opens nothing any more.` };
  }
};
