import { jobPageSchema, jobsQuery } from '$lib/model/api/operations/diagnoses';
import { toJob } from '$lib/model/api/to-job';
import { pageOfJobs } from '$lib/server/services/jobs/page-of-jobs';
import { askToken } from '../../../ask-token';
import { problem } from '../../../problem';
import { BAD_CURSOR, nextPage, readQuery, told } from '../../answers';
import type { RequestHandler } from './$types';

/** A page of the team's jobs. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readQuery(event.url, jobsQuery);
  if (!read.ok) return read.response;
  const found = pageOfJobs(event.locals.db, asked.actor, read.query);
  if (!found.ok) return problem(BAD_CURSOR);
  const { entries, next } = found.page;
  return told(jobPageSchema, { data: entries.map(toJob), next }, { headers: nextPage(event.url, next) });
};
