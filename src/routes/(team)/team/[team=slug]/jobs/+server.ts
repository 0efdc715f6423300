import { readJobQuery } from '$lib/model/team/jobs/job-query';
import { enqueueJobs } from '$lib/server/services/jobs/enqueue-jobs';
import { listJobs } from '$lib/server/services/jobs/list-jobs';
import { json } from '@sveltejs/kit';
import { askTeamJson } from '../../../../ask-json';
import { problem } from '../../../../problem';
import { answering } from '../datasets/answers';
import { readRequest } from './read-request';
import { refusalOf } from './refusals';
import type { RequestHandler } from './$types';

/** One page of the team's jobs as JSON (JobList), by the query of the page's own address; HTML is the page. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const list = listJobs(event.locals.db, asked.actor, readJobQuery(event.url.searchParams));
  return json(list, { headers: { 'cache-control': 'no-store' } });
};

/**
 * Asks for diagnoses: {dataset: [ids], resamples?, alpha?, seed?, tolerance?} as JSON or as a form gives 202 and
 * {jobs: [{id, datasetId, already}]}. A form of a page, which accepts HTML, goes to the page's own action instead.
 */
export const POST: RequestHandler = async (event) => {
  const allowed = askTeamJson(event, 'diagnose');
  if (!allowed.ok) return allowed.response;
  const read = await readRequest(event.request);
  if (!read.ok) return problem(read.problem);
  const { dataset, ...hardness } = read.asked;
  return answering(() => {
    const result = enqueueJobs(event.locals.db, allowed.actor, dataset, hardness);
    return result.ok ? json({ jobs: result.jobs }, { status: 202 }) : problem(refusalOf(result));
  });
};
