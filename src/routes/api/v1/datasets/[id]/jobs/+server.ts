import { toJob } from '$lib/model/api/to-job';
import { hardnessSchema } from '$lib/model/team/jobs/job-request';
import { enqueueJobs } from '$lib/server/services/jobs/enqueue-jobs';
import { jobsByIds } from '$lib/server/services/jobs/list-jobs';
import { refusalOf } from '../../../../../(team)/team/[team=slug]/jobs/refusals';
import { askToken } from '../../../../../ask-token';
import { faults, NOT_HERE } from '../../../../answers';
import { posted } from '../../../../posted';
import type { RequestHandler } from './$types';

/** Asks for a diagnosis of the dataset; the body says how hard to look, or is empty. */
export const POST: RequestHandler = async (event) => {
  const asked = await askToken(event, 'diagnose');
  if (!asked.ok) return asked.response;
  const { db } = event.locals;
  const { actor } = asked;
  return posted(event, asked, (bytes, type) => {
    if (bytes.length > 0 && type !== 'application/json')
      return {
        refused: { status: 415, code: 'wrong-type', title: 'Send JSON, as application/json, or nothing.' }
      };
    let given: unknown;
    try {
      given = bytes.length > 0 ? JSON.parse(new TextDecoder().decode(bytes)) : {};
    } catch {
      return { refused: { status: 400, code: 'bad-json', title: 'The body is not JSON.' } };
    }
    const read = hardnessSchema.safeParse(given);
    if (!read.success) {
      const list = read.error.issues.map(({ path, message }) => ({ at: path.join('.'), message }));
      const title = 'Some of that does not fit. Nothing was asked for.';
      return { refused: { status: 422, code: 'bad-input', title, ...faults(list) } };
    }
    const result = enqueueJobs(db, actor, [event.params.id], read.data);
    if (!result.ok) return { refused: refusalOf(result) };
    const [job] = jobsByIds(db, actor, [result.jobs[0].id]);
    if (!job) return { refused: NOT_HERE };
    const body = JSON.stringify(toJob(job));
    return { done: { status: 202, location: `/api/v1/jobs/${job.id}`, body } };
  });
};
