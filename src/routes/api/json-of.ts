import type { z } from 'zod';
import type { Problem } from '../problem';
import { faults } from './answers';

/** A JSON body by its schema, or why it is none: of another type, cut short or no JSON, or with fields that do not fit. */
export function jsonOf<Shape extends z.ZodType>(
  bytes: Uint8Array,
  type: string,
  schema: Shape
): { ok: true; body: z.output<Shape> } | { ok: false; refused: Problem } {
  const refuse = (refused: Problem) => ({ ok: false as const, refused });
  if (type !== 'application/json')
    return refuse({ status: 415, code: 'wrong-type', title: 'Send JSON, as application/json.' });
  let given: unknown;
  try {
    given = JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes));
  } catch {
    const title = 'The body is not JSON, or was cut short. Nothing was saved.';
    return refuse({ status: 400, code: 'bad-json', title });
  }
  const read = schema.safeParse(given);
  if (read.success) return { ok: true, body: read.data };
  const list = read.error.issues.map(({ path, message }) => ({ at: path.join('.'), message }));
  const title = 'Some of that does not fit. Nothing was saved.';
  return refuse({ status: 422, code: 'bad-input', title, ...faults(list) });
}
