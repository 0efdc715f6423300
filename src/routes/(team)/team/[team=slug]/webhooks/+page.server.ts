import { webhookFormSchema } from '$lib/model/webhooks/webhook-form';
import { listWebhooks } from '$lib/server/services/webhooks/list-webhooks';
import { makeWebhook } from '$lib/server/services/webhooks/make-webhook';
import { webhookSettings } from '$lib/server/services/webhooks/webhook-settings';
import { error, fail } from '@sveltejs/kit';
import { message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { askTeam } from '../../../../ask';
import { MAKING } from './refusals';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async (event) => {
  const { actor } = askTeam(event, 'manage');
  return {
    webhooks: listWebhooks(event.locals.db, actor),
    form: await superValidate(zod4(webhookFormSchema), { errors: false })
  };
};

export const actions: Actions = {
  make: async (event) => {
    const { actor } = askTeam(event, 'manage');
    const form = await superValidate(await event.request.formData(), zod4(webhookFormSchema));
    if (!form.valid) return fail(400, { form });
    const { name } = form.data;
    const made = makeWebhook(event.locals.db, actor, form.data, webhookSettings());
    // The page that shows a secret is for nobody's cache: withPerson says so for everybody signed in.
    if (made.ok) return message(form, { id: made.id, name, secret: made.secret });
    if (made.reason === 'inner-address') return setError(form, 'url', MAKING['inner-address']);
    if (made.reason === 'too-many') return setError(form, 'name', MAKING['too-many'], { status: 409 });
    error(403, { message: MAKING['not-allowed'], code: 'not-allowed' });
  }
};
