import { toJob } from '$lib/model/api/to-job';
import { hardnessSchema } from '$lib/model/team/jobs/job-request';
import { enqueueJobs } from '$lib/server/services/jobs/enqueue-jobs';
import { jobsByIds } from '$lib/server/services/jobs/list-jobs';
import { refusalOf } from '../../../../../(team)/team/[team=slug]/jobs/refusals';
import { askToken } from '../../../../../ask-token';
import { NOT_HERE } from '../../../../answers';
import { jsonBody } from '../../../../json-body';
import { posted } from '../../../../posted';
import type { RequestHandler } from './$types';

/** No body: nothing is chosen. */
const AS_IT_IS = { ok: true, data: hardnessSchema.parse({}) } as const;

/** Asks for a diagnosis of the dataset; the body says how hard to look, or is empty. */
export const POST: RequestHandler = async (event) => {
  const asked = await askToken(event, 'diagnose');
  if (!asked.ok) return asked.response;
  const { db } = event.locals;
  const { actor } = asked;
  return posted(event, asked, (bytes, type) => {
    const read = bytes.length === 0 ? AS_IT_IS : jsonBody(bytes, type, hardnessSchema);
    if (!read.ok) return { refused: read.refused };
    const result = enqueueJobs(db, actor, [event.params.id], read.data);
    if (!result.ok) return { refused: refusalOf(result) };
    const [job] = jobsByIds(db, actor, [result.jobs[0].id]);
    if (!job) return { refused: NOT_HERE };
    const body = JSON.stringify(toJob(job));
    return { done: { status: 202, location: `/api/v1/jobs/${job.id}`, body } };
  });
};
