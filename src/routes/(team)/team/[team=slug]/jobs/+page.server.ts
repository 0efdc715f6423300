import { readJobQuery } from '$lib/model/team/jobs/job-query';
import { enqueueJobs } from '$lib/server/services/jobs/enqueue-jobs';
import { listJobs } from '$lib/server/services/jobs/list-jobs';
import { error, fail, redirect } from '@sveltejs/kit';
import { askTeam } from '../../../../ask';
import { acting } from '../datasets/answers';
import { backToList } from '../datasets/back-to-list';
import { readRequest } from './read-request';
import { refusalOf } from './refusals';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'see');
  return { list: listJobs(event.locals.db, actor, readJobQuery(event.url.searchParams)) };
};

export const actions: Actions = {
  default: async (event) => {
    const { team, actor } = askTeam(event, 'diagnose');
    const sent = event.request.clone();
    const read = await readRequest(event.request);
    if (!read.ok && read.problem.code === 'bad-input') {
      const form = await sent.formData();
      // Nothing was marked in the table.
      if (form.has('list') && !form.has('dataset')) redirect(303, backToList(team.slug, form.get('list')));
    }
    if (!read.ok) return fail(read.problem.status, { message: read.problem.title });
    const { dataset, ...hardness } = read.asked;
    return acting({}, () => {
      const result = enqueueJobs(event.locals.db, actor, dataset, hardness);
      if (result.ok) redirect(303, `/team/${team.slug}/jobs`);
      const { status, title, code } = refusalOf(result);
      if (status === 404) error(404, { message: 'There is no page at this address.', code });
      return fail(status, { message: title });
    });
  }
};
