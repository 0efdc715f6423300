import { readSweepFilter } from '$lib/model/team/sweeps/sweep-filter';
import { tickedDatasets } from '$lib/model/team/sweeps/ticked-datasets';
import { TRANSITIONS } from '$lib/model/team/sweeps/transitions';
import { saveSweep } from '$lib/server/services/sweeps/save-sweep';
import { sweepableDatasets } from '$lib/server/services/sweeps/sweepable-datasets';
import { fail, redirect } from '@sveltejs/kit';
import { askTeam } from '../../../../../ask';
import { acting } from '../../datasets/answers';
import { requestOfForm, typedOfForm } from './request-of-form';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'diagnose');
  const filter = readSweepFilter(event.url.searchParams);
  const offered = sweepableDatasets(event.locals.db, actor, filter);
  return {
    filter,
    offered,
    ticked: tickedDatasets(offered.rows, filter),
    classes: TRANSITIONS
  };
};

export const actions: Actions = {
  default: async (event) => {
    const { team, actor } = askTeam(event, 'diagnose');
    const form = await event.request.formData();
    const kept = { typed: typedOfForm(form), chosen: form.getAll('dataset').map(String) };
    const read = requestOfForm(form);
    if (!read.ok) return fail(400, { ...kept, message: read.why });
    return acting(kept, () => {
      const made = saveSweep(event.locals.db, actor, read.request);
      if (made.ok) redirect(303, `/team/${team.slug}/sweeps/${made.id}`);
      if (made.reason === 'unknown')
        return fail(404, { ...kept, message: 'At least one of these datasets is not here.' });
      return fail(422, { ...kept, message: made.why });
    });
  }
};
