import { readJobQuery } from '$lib/model/team/jobs/job-query';
import { listJobs } from '$lib/server/services/jobs/list-jobs';
import { json } from '@sveltejs/kit';
import { askTeamJson } from '../../../../../ask-json';
import type { RequestHandler } from './$types';

/** One page of the team's jobs: the query of the page's own address gives JobList as JSON. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const list = listJobs(event.locals.db, asked.actor, readJobQuery(event.url.searchParams));
  return json(list, { headers: { 'cache-control': 'no-store' } });
};
