import { renameSchema } from '$lib/model/team/members/team-name';
import { renameTeam } from '$lib/server/services/teams/rename-team';
import { importArchive } from '$lib/server/services/transfer/import-archive';
import { error, fail } from '@sveltejs/kit';
import { message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { askTeam } from '../../../../ask';
import type { Actions, PageServerLoad } from './$types';
import { refusalWords } from './refusal-words';

export const load: PageServerLoad = async (event) => {
  const { team } = askTeam(event, 'manage');
  return { form: await superValidate({ name: team.name }, zod4(renameSchema)) };
};

export const actions: Actions = {
  rename: async (event) => {
    const { actor } = askTeam(event, 'manage');
    const form = await superValidate(await event.request.formData(), zod4(renameSchema));
    if (!form.valid) return fail(400, { form });
    const done = renameTeam(event.locals.db, actor, form.data.name);
    if (done.ok) return message(form, 'Renamed. Its address stays as it was.');
    if (done.reason === 'bad-name') return setError(form, 'name', 'This is no name for a team.');
    error(403, { message: 'Your role in this team does not allow that.', code: 'not-allowed' });
  },
  import: async (event) => {
    const { actor } = askTeam(event, 'manage');
    let data: FormData;
    try {
      data = await event.request.formData();
    } catch {
      // Past BODY_SIZE_LIMIT, or broken off.
      return fail(413, {
        problem:
          'The archive did not arrive whole: it is larger than this server takes (BODY_SIZE_LIMIT), or the connection broke. Nothing was imported.'
      });
    }
    const archive = data.get('archive');
    if (!(archive instanceof File) || archive.size === 0)
      return fail(400, { problem: 'Choose the archive first: a zip that a team exported here.' });
    const bytes = new Uint8Array(await archive.arrayBuffer());
    const done = importArchive(event.locals.db, actor, bytes, data.get('again') === 'yes');
    if (!done.ok) return fail(400, refusalWords(done));
    const counted = (n: number, one: string) => `${n} ${one}${n === 1 ? '' : 's'}`;
    return {
      told: `Imported from “${done.from}”: ${counted(done.datasets, 'dataset')}, ${counted(done.reports, 'report')} and ${counted(done.remarks, 'remark')}. Links stay closed.`
    };
  }
};
