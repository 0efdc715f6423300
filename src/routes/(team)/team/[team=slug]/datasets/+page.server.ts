import { readDatasetQuery } from '$lib/model/team/datasets/dataset-query';
import { listDatasets } from '$lib/server/services/datasets/list-datasets';
import { listFacets } from '$lib/server/services/datasets/list-facets';
import { restoreDataset } from '$lib/server/services/datasets/restore-dataset';
import { takeSample } from '$lib/server/services/datasets/take-sample';
import { listSamples } from '$lib/server/services/samples';
import { fail, redirect } from '@sveltejs/kit';
import { askTeam } from '../../../../ask';
import { acting } from './answers';
import { saveRefusal } from './save-refusal';
import type { Actions, PageServerLoad } from './$types';

/** The table with its first page; on later changes of the address the page asks the JSON route itself. */
export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'see');
  const { locals, url } = event;
  const list = event.isDataRequest
    ? null
    : listDatasets(locals.db, actor, readDatasetQuery(url.searchParams));
  const samples = listSamples(locals.db).map(({ slug, title, about, invented }) => ({
    slug,
    title,
    about,
    invented
  }));
  return { list, facets: listFacets(locals.db, actor), samples };
};

export const actions: Actions = {
  /** Makes an example a dataset of the team. */
  sample: async (event) => {
    const { team, actor } = askTeam(event, 'upload');
    const slug = String((await event.request.formData()).get('sample') ?? '');
    return acting({}, () => {
      const taken = takeSample(event.locals.db, actor, slug);
      if (taken.ok) {
        const [first] = taken.saved;
        redirect(303, `/team/${team.slug}/datasets${taken.saved.length === 1 ? `/${first.id}` : ''}`);
      }
      if (taken.reason === 'unknown-sample')
        return fail(404, { message: 'There is no example of that name.' });
      if (taken.reason === 'already-there')
        redirect(303, `/team/${team.slug}/datasets/${taken.already[0].id}`);
      const { status, title } = saveRefusal(taken);
      return fail(status, { message: title });
    });
  },

  /** Brings back what was just put aside. */
  restore: async (event) => {
    // Whether there is anything at all this person may bring back; whose it is the service asks of the row.
    const { team, actor } = askTeam(event, 'restore', { createdBy: event.locals.person?.id });
    const id = String((await event.request.formData()).get('dataset') ?? '');
    return acting({}, () => {
      const back = restoreDataset(event.locals.db, actor, id);
      if (!back.ok)
        return fail(404, { message: 'That dataset is not put aside, or not yours to bring back.' });
      redirect(303, `/team/${team.slug}/datasets/${id}`);
    });
  }
};
