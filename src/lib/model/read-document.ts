import type { Diagnosis } from '$lib/stats/types';
import { diagnosisSchema } from './diagnosis-schema';

export type ReadDocument = { ok: true; diagnosis: Diagnosis } | { ok: false; problem: string };

/** A stored diagnosis document, checked; or what is wrong with it, in words. */
export function readDocument(text: string): ReadDocument {
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    return { ok: false, problem: 'it is not whole JSON' };
  }
  const read = diagnosisSchema.safeParse(value);
  if (read.success) return { ok: true, diagnosis: read.data };
  const [issue] = read.error.issues;
  const place = issue.path
    .map((part) => (typeof part === 'number' ? `[${part}]` : `.${String(part)}`))
    .join('');
  return {
    ok: false,
    problem: `${place ? `at ${place.replace(/^\./, '')}: ` : ''}${issue.message}`
  };
}
