import { saveRequestSchema } from '$lib/model/team/datasets/save-request';
import { saveDatasets } from '$lib/server/services/datasets/save-datasets';
import { fail, redirect } from '@sveltejs/kit';
import { askTeam } from '../../../../../ask';
import { acting, bodyTrouble } from '../answers';
import { saveRefusal } from '../save-refusal';
import { filesOfForm } from './files-of-form';
import { previewsOfForm } from './previews-of-form';
import { saveRequestOfForm } from './save-request-of-form';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = (event) => {
  askTeam(event, 'upload');
};

/** The two steps of a browser without JavaScript; with it the page uses the JSON routes. */
export const actions: Actions = {
  /** Reads files that were chosen, and those read before in the way that is chosen now. */
  read: async (event) => {
    const { actor } = askTeam(event, 'upload');
    let data: FormData;
    try {
      data = await event.request.formData();
    } catch (error) {
      const { status, title } = bodyTrouble(error);
      return fail(status, { message: title });
    }
    const files = await filesOfForm(data);
    return acting({}, () => {
      const { previews, message } = previewsOfForm(event.locals.db, actor, data, files);
      return message ? fail(422, { previews, message }) : { previews };
    });
  },

  save: async (event) => {
    const { team, actor } = askTeam(event, 'upload');
    let data: FormData;
    try {
      data = await event.request.formData();
    } catch (error) {
      const { status, title } = bodyTrouble(error);
      return fail(status, { message: title });
    }
    const { db } = event.locals;
    const { previews } = previewsOfForm(db, actor, data, []);
    const { request, drafts, wrong } = saveRequestOfForm(data, previews);
    const kept = { previews, drafts };
    if (wrong) return fail(400, { ...kept, message: 'Some conditions do not fit: they are marked.' });
    const read = saveRequestSchema.safeParse(request);
    if (!read.success) return fail(400, { ...kept, message: 'No dataset is marked to be saved.' });
    return acting(kept, () => {
      const done = saveDatasets(db, actor, read.data);
      if (done.ok) redirect(303, `/team/${team.slug}/datasets?added=${done.saved.length}`);
      const { status, title } = saveRefusal(done);
      const troubles = done.reason === 'bad-conditions' ? done.troubles : [];
      for (const { fileId, index, problems } of troubles) {
        const file = previews.findIndex((preview) => preview.file.id === fileId);
        const draft = drafts[file]?.find((one) => one.index === index);
        if (draft) draft.problems = problems;
      }
      return fail(status, { ...kept, message: title });
    });
  }
};
