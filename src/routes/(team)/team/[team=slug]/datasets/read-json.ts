import { weighedJson } from '$lib/model/weighed-json';
import type { z } from 'zod';
import { problem } from '../../../../problem';
import { bodyTrouble } from './answers';

/** The body of a JSON request as a schema wants it, or problem details that name each field that does not fit. */
export async function readJson<Shape extends z.ZodType>(
  request: Request,
  schema: Shape
): Promise<{ ok: true; body: z.output<Shape> } | { ok: false; response: Response }> {
  const type = request.headers.get('content-type')?.split(';')[0].trim().toLowerCase();
  const refuse = (status: number, code: string, title: string, more: object = {}) => ({
    ok: false as const,
    response: problem({ status, code, title, ...more })
  });
  if (type !== 'application/json') return refuse(415, 'wrong-type', 'Send JSON, as application/json.');
  let bytes: Uint8Array;
  try {
    bytes = new Uint8Array(await request.arrayBuffer());
  } catch (error) {
    return { ok: false, response: problem(bodyTrouble(error)) };
  }
  const given = weighedJson(bytes);
  if (!given.ok)
    return refuse(400, 'bad-json', 'The body is not JSON that can be read.', { detail: given.why });
  const read = schema.safeParse(given.value);
  if (read.success) return { ok: true, body: read.data };
  const fields = read.error.issues.slice(0, 20).map(({ path, message }) => ({ at: path.join('.'), message }));
  return refuse(422, 'bad-input', 'Some of that does not fit.', { fields });
}
