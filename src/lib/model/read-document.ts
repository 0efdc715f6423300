import { engineVersion } from '$lib/stats/engine-version';
import type { Diagnosis } from '$lib/stats/types';
import { diagnosisSchema } from './diagnosis-schema';
import { olderDocument } from './older-document';

export type ReadDocument = { ok: true; diagnosis: Diagnosis } | { ok: false; problem: string };

/** A stored diagnosis document, also one of an older engine, checked; or what is wrong with it, in words. */
export function readDocument(text: string): ReadDocument {
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    return { ok: false, problem: 'it is not whole JSON' };
  }
  const read = diagnosisSchema.safeParse(value);
  if (read.success) return { ok: true, diagnosis: read.data };
  const older = diagnosisSchema.safeParse(olderDocument(value));
  if (older.success) return { ok: true, diagnosis: older.data };
  const [issue] = older.error.issues;
  const place = issue.path
    .map((part) => (typeof part === 'number' ? `[${part}]` : `.${String(part)}`))
    .join('');
  const at = place ? `at ${place.replace(/^\./, '')}: ` : '';
  return { ok: false, problem: `${at}${issue.message}${otherEngine(value)}` };
}

/** Which engine wrote it, where that may be the reason. */
function otherEngine(value: unknown): string {
  const engine = (value as { engine?: { version?: unknown } } | null)?.engine?.version;
  return typeof engine === 'string' && engine !== engineVersion
    ? ` (it was made by engine ${engine.slice(0, 20)}; this program runs ${engineVersion})`
    : '';
}
