import type { z } from 'zod';
import { parseJson } from './parse-json';

/** A file of an archive that does not say what it must. */
export class Bad extends Error {}

export const bad = (what: string): never => {
  throw new Bad(what);
};

/**
 * Checked by the schema, and then taken as it stands: what a schema gives back has its keys in another order, and the
 * next export would no longer be the same to the byte.
 */
export function readEntry<T>(files: Map<string, Uint8Array>, path: string, schema: z.ZodType<T>): T {
  const bytes = files.get(path) ?? bad(`${path} is missing.`);
  const value = parseJson(bytes);
  const result = schema.safeParse(value);
  if (result.success) return value as T;
  const [issue] = result.error.issues;
  return bad(`${path}: ${issue.path.join('.')}: ${issue.message}`);
}
