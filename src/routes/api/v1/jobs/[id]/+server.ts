import { jobSchema } from '$lib/model/api/shapes/job';
import { toJob } from '$lib/model/api/to-job';
import { jobsByIds } from '$lib/server/services/jobs/list-jobs';
import { askToken } from '../../../../ask-token';
import { problem } from '../../../../problem';
import { NOT_HERE, told } from '../../../answers';
import type { RequestHandler } from './$types';

/** How a diagnosis goes; until it ends, Retry-After says when it is worth asking again. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const [job] = jobsByIds(event.locals.db, asked.actor, [event.params.id]);
  if (!job) return problem(NOT_HERE);
  const waits = job.status === 'queued' || job.status === 'running';
  return told(jobSchema, toJob(job), { headers: waits ? { 'retry-after': '2' } : {} });
};
