import { listAside } from '$lib/server/services/aside/list-aside';
import { restoreDataset } from '$lib/server/services/datasets/restore-dataset';
import { restoreReport } from '$lib/server/services/reports/restore-report';
import { restoreSiteMap } from '$lib/server/services/site-maps/restore-site-map';
import { restoreSweep } from '$lib/server/services/sweeps/restore-sweep';
import { fail } from '@sveltejs/kit';
import { askTeam } from '../../../../ask';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'see');
  return { things: listAside(event.locals.db, actor) };
};

const GONE = 'It is not here any more: somebody brought it back already, or it is not yours to bring back.';

export const actions: Actions = {
  // Whether it is the person's own is asked by the services, with the row in hand.
  dataset: async (event) => {
    const { actor } = askTeam(event, 'see');
    const id = String((await event.request.formData()).get('id'));
    const back = restoreDataset(event.locals.db, actor, id);
    if (!back.ok) return fail(404, { problem: GONE });
    return { told: `“${back.name}” is back, with its reports.`, href: `datasets/${id}` };
  },
  sweep: async (event) => {
    const { actor } = askTeam(event, 'see');
    const id = String((await event.request.formData()).get('id'));
    const back = restoreSweep(event.locals.db, actor, id);
    if (!back.ok) return fail(404, { problem: GONE });
    return { told: `The sweep “${back.name}” is back.`, href: `sweeps/${id}` };
  },
  'site-map': async (event) => {
    const { actor } = askTeam(event, 'see');
    const id = String((await event.request.formData()).get('id'));
    const back = restoreSiteMap(event.locals.db, actor, id);
    if (!back.ok) return fail(404, { problem: GONE });
    return { told: `The map of sites “${back.name}” is back.`, href: `sites/${id}` };
  },
  report: async (event) => {
    const { actor } = askTeam(event, 'see');
    const id = String((await event.request.formData()).get('id'));
    const back = restoreReport(event.locals.db, actor, id);
    if (back.ok) return { told: `Report ${back.number} is back.`, href: `reports/${id}` };
    if (back.reason === 'unknown') return fail(404, { problem: GONE });
    return fail(409, { problem: 'Its dataset is put aside too: bring that back first.' });
  }
};
