import type { z } from 'zod';
import { parseJson } from './parse-json';

/** Heaviest document: a schema makes an object of every value that does not fit, 1.6 GB of so many. */
const DOCUMENT_WEIGHT = 2_000_000;

/** A file of an archive that does not say what it must. */
export class Bad extends Error {}

export const bad = (what: string): never => {
  throw new Bad(what);
};

/**
 * Checked by the schema, and then taken as it stands: what a schema gives back has its keys in another order, and the
 * next export would no longer be the same to the byte.
 *
 * @param most heaviest it may be; more only where `listOf` reads what is long
 */
export function readEntry<T>(
  files: Map<string, Uint8Array>,
  path: string,
  schema: z.ZodType<T>,
  most = DOCUMENT_WEIGHT
): T {
  const bytes = files.get(path) ?? bad(`${path} is missing.`);
  const value = parseJson(bytes, most);
  const result = schema.safeParse(value);
  if (result.success) return value as T;
  const [issue] = result.error.issues;
  return bad(`${path}: ${issue.path.join('.')}: ${issue.message}`);
}
