import { newDatasetSchema, statedConditions } from '../../../model/api/shapes/new-dataset';
import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { readOne } from './read-one';
import { uploadDataset, type UploadedDataset } from './upload-dataset';

export type UploadedJson =
  | UploadedDataset
  /** Not JSON, or fields besides the counts that do not fit. */
  | { ok: false; reason: 'bad-fields'; fields: { at: string; message: string }[] };

/**
 * Saves a dataset that came as JSON, counts and conditions together. The counts are judged first, by the reader of JSON
 * files, which names lines; the body itself is the file that is kept.
 */
export function uploadJson(db: Database, actor: Actor, bytes: Uint8Array, now = Date.now()): UploadedJson {
  const choices = { format: 'json' as const, encoding: 'utf-8' as const };
  const read = readOne(bytes, 'counts.json', choices);
  if (!read.ok) return read;
  let body: unknown;
  try {
    body = JSON.parse(new TextDecoder().decode(bytes));
  } catch {
    // Such as NaN, which the reader understands in order to refuse it where it is a count.
    return { ok: false, reason: 'bad-fields', fields: [{ at: '', message: 'The body is not JSON.' }] };
  }
  const given = newDatasetSchema.safeParse(body);
  if (!given.success) {
    const fields = given.error.issues.map(({ path, message }) => ({ at: path.join('.'), message }));
    return { ok: false, reason: 'bad-fields', fields };
  }
  const { name, conditions } = given.data;
  const stated = statedConditions({ ...conditions, name });
  const upload = { fileName: `${name ?? 'counts'}.json`, bytes, choices, stated, columnsState: false };
  return uploadDataset(db, actor, upload, now);
}
