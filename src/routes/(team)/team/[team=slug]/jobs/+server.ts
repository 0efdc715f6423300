import { enqueueJobs } from '$lib/server/services/jobs/enqueue-jobs';
import { json } from '@sveltejs/kit';
import { askTeamJson } from '../../../../ask-json';
import { problem } from '../../../../problem';
import { answering } from '../datasets/answers';
import { readRequest } from './read-request';
import { refusalOf } from './refusals';
import type { RequestHandler } from './$types';

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
