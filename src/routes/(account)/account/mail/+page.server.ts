import { watchFormSchema } from '$lib/model/watches/watch-form';
import { account } from '$lib/server/services/accounts/account';
import { waysIn } from '$lib/server/services/accounts/ways-in';
import { digestHour } from '$lib/server/services/watches/digest-hour';
import { myWatches } from '$lib/server/services/watches/my-watches';
import { saveWatch } from '$lib/server/services/watches/save-watch';
import { fail, redirect } from '@sveltejs/kit';
import { askPerson } from '../../../ask';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = (event) => {
  const { id } = askPerson(event);
  const mine = account(event.locals.db, id);
  if (!mine) redirect(303, '/sign-in');
  return {
    email: mine.email,
    watches: myWatches(event.locals.db, id),
    hour: digestHour(),
    mails: waysIn().mail
  };
};

export const actions: Actions = {
  save: async (event) => {
    const { id } = askPerson(event);
    const form = await event.request.formData();
    const read = watchFormSchema.safeParse({
      about: form.getAll('about'),
      rhythm: form.get('rhythm') ?? undefined
    });
    if (!read.success) return fail(400, { problem: 'Choose from what is offered. Nothing was changed.' });
    const saved = saveWatch(event.locals.db, id, String(form.get('team')), read.data);
    if (!saved.ok) return fail(404, { problem: 'You are in no such team. Nothing was changed.' });
    const none = read.data.about.length === 0;
    return { told: none ? `You hear nothing of ${saved.team} by mail.` : `Saved for ${saved.team}.` };
  }
};
