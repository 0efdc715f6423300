import { readReportQuery } from '$lib/model/team/reports/report-query';
import { listReports } from '$lib/server/services/reports/list-reports';
import { reportFacets } from '$lib/server/services/reports/report-facets';
import { restoreReport } from '$lib/server/services/reports/restore-report';
import { fail, redirect } from '@sveltejs/kit';
import { askTeam } from '../../../../ask';
import type { Actions, PageServerLoad } from './$types';

/** The table with its first page; on later changes of the address the page asks the JSON route itself. */
export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'see');
  const query = readReportQuery(event.url.searchParams);
  return {
    list: event.isDataRequest ? null : listReports(event.locals.db, actor, query),
    facets: reportFacets(event.locals.db, actor, query.dataset)
  };
};

const REFUSED = {
  unknown: { status: 404, message: 'That report is not put aside, or not yours to bring back.' },
  'dataset-aside': {
    status: 409,
    message: 'Its dataset is put aside too. Bring that back first, under “Put aside”.'
  }
};

export const actions: Actions = {
  /** Brings back what was just put aside. */
  restore: async (event) => {
    const { team, actor } = askTeam(event, 'see');
    const id = String((await event.request.formData()).get('report') ?? '');
    // Whose it is decides: the service asks it of the row itself.
    const back = restoreReport(event.locals.db, actor, id);
    if (back.ok) redirect(303, `/team/${team.slug}/reports/${id}`);
    const { status, message } = REFUSED[back.reason];
    return fail(status, { message });
  }
};
