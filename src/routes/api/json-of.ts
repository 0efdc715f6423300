import { weighedJson } from '$lib/model/weighed-json';
import type { z } from 'zod';
import type { Problem } from '../problem';
import { badJson, faults } from './answers';

/** A JSON body by its schema, or why it is none: of another type, cut short or no JSON, or with fields that do not fit. */
export function jsonOf<Shape extends z.ZodType>(
  bytes: Uint8Array,
  type: string,
  schema: Shape
): { ok: true; body: z.output<Shape> } | { ok: false; refused: Problem } {
  const refuse = (refused: Problem) => ({ ok: false as const, refused });
  if (type !== 'application/json')
    return refuse({ status: 415, code: 'wrong-type', title: 'Send JSON, as application/json.' });
  const given = weighedJson(bytes);
  if (!given.ok) return refuse(badJson(given.why));
  const read = schema.safeParse(given.value);
  if (read.success) return { ok: true, body: read.data };
  const list = read.error.issues.map(({ path, message }) => ({ at: path.join('.'), message }));
  const title = 'Some of that does not fit. Nothing was saved.';
  return refuse({ status: 422, code: 'bad-input', title, ...faults(list) });
}
