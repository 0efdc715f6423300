import { jobRequestSchema, requestOfForm, type JobRequest } from '$lib/model/team/jobs/job-request';
import type { Problem } from '../../../../problem';
import { bodyTrouble } from '../datasets/answers';

/** A request for jobs from a form or from JSON, whichever came. */
export async function readRequest(
  request: Request
): Promise<{ ok: true; asked: JobRequest } | { ok: false; problem: Problem }> {
  const type = request.headers.get('content-type')?.split(';')[0].trim().toLowerCase() ?? '';
  const refuse = (problem: Problem) => ({ ok: false, problem }) as const;
  let given: unknown;
  try {
    if (type === 'application/json') {
      const text = await request.text();
      try {
        given = JSON.parse(text);
      } catch {
        return refuse({ status: 400, code: 'bad-json', title: 'The body is not JSON.' });
      }
    } else if (type === 'multipart/form-data' || type === 'application/x-www-form-urlencoded') {
      given = requestOfForm(await request.formData());
    } else {
      return refuse({ status: 415, code: 'wrong-type', title: 'Send JSON, as application/json, or a form.' });
    }
  } catch (error) {
    return refuse(bodyTrouble(error));
  }
  const read = jobRequestSchema.safeParse(given);
  if (read.success) return { ok: true, asked: read.data };
  const fields = read.error.issues.slice(0, 20).map(({ path, message }) => ({ at: path.join('.'), message }));
  const [{ at, message }] = fields;
  const title = at === 'dataset' ? message : `“${at}” does not fit: ${message}`;
  return refuse({ status: 422, code: 'bad-input', title, fields });
}
