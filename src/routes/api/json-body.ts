import { weighedJson } from '$lib/model/weighed-json';
import type { z } from 'zod';
import type { Problem } from '../problem';
import { badJson, faults } from './answers';

/** The body of a POST as JSON of a schema, or why it is not. */
export function jsonBody<Shape extends z.ZodType>(
  bytes: Uint8Array,
  type: string,
  schema: Shape
): { ok: true; data: z.output<Shape> } | { ok: false; refused: Problem } {
  const refuse = (refused: Problem) => ({ ok: false, refused }) as const;
  if (type !== 'application/json')
    return refuse({ status: 415, code: 'wrong-type', title: 'Send JSON, as application/json.' });
  const given = weighedJson(bytes);
  if (!given.ok) return refuse(badJson(given.why));
  const read = schema.safeParse(given.value);
  if (read.success) return { ok: true, data: read.data };
  const list = read.error.issues.map(({ path, message }) => ({ at: path.join('.'), message }));
  const title = 'Some of that does not fit. Nothing was done.';
  return refuse({ status: 422, code: 'bad-input', title, ...faults(list) });
}
