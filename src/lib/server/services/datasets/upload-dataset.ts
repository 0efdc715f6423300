import { recogniseConditions } from '../../../formats/conditions/recognise-conditions';
import type { StatedConditions } from '../../../model/api/shapes/new-dataset';
import { conditionsSchema } from '../../../model/team/datasets/conditions';
import type { NamedDataset } from '../../../model/team/datasets/preview';
import type { ConditionProblems } from '../../../model/team/datasets/read-typed-conditions';
import type { ReadingChoices } from '../../../model/team/datasets/reading-choices';
import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { misfits } from './misfits';
import { readOne, type ReadOne } from './read-one';
import { saveDatasets } from './save-datasets';
import { storeFile } from './store-file';

export interface Upload {
  /** Of the file; gives a dataset without a name its own. */
  fileName: string;
  bytes: Uint8Array;
  choices: ReadingChoices;
  /** Conditions that come before what the file states; what is left out is as the file says. */
  stated: StatedConditions;
  /** Whether the columns of the file state conditions too. */
  columnsState: boolean;
}

export type UploadedDataset =
  | { ok: true; id: string }
  | { ok: false; reason: 'not-allowed' }
  | Extract<ReadOne, { ok: false }>
  | { ok: false; reason: 'bad-conditions'; problems: ConditionProblems }
  | { ok: false; reason: 'already-there'; already: NamedDataset[] };

/**
 * Saves the one dataset of a file in one go, as a script does it: read, checked, then kept by the same path as on the
 * page. A file that cannot be read, or whose conditions do not fit, is not kept.
 */
export function uploadDataset(
  db: Database,
  actor: Actor,
  { fileName, bytes, choices, stated, columnsState }: Upload,
  now = Date.now()
): UploadedDataset {
  const read = readOne(bytes, fileName, choices);
  if (!read.ok) return read;
  const { dataset } = read;
  const found = recogniseConditions(columnsState ? dataset : { ...dataset, conditions: {} }).conditions;
  const conditions = conditionsSchema.parse({ ...found, ...stated });
  const problems = misfits(conditions, dataset.data);
  if (Object.keys(problems).length > 0) return { ok: false, reason: 'bad-conditions', problems };
  const stored = storeFile(db, actor, { name: fileName, bytes }, now);
  if (!stored.ok) return stored.reason === 'not-allowed' ? { ok: false, reason: 'not-allowed' } : stored;
  const part = { fileId: stored.file.id, choices, again: false, datasets: [{ index: 0, conditions }] };
  const saved = saveDatasets(db, actor, { files: [part] }, now);
  if (saved.ok) return { ok: true, id: saved.saved[0].id };
  switch (saved.reason) {
    case 'already-there':
      return saved;
    case 'not-allowed':
      return { ok: false, reason: 'not-allowed' };
    case 'bad-conditions':
      return { ok: false, reason: 'bad-conditions', problems: saved.troubles[0].problems };
    default:
      // Read a moment ago by the same reader: anything else is an error of the program.
      throw new Error(`A file that could be read could not be saved: ${saved.reason}.`);
  }
}
