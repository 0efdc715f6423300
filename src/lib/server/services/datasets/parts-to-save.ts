import { and, eq } from 'drizzle-orm';
import type { Conditions } from '../../../model/team/datasets/conditions';
import type { ReadingChoices } from '../../../model/team/datasets/reading-choices';
import type { SaveRequest } from '../../../model/team/datasets/save-request';
import { BadInput } from '../../../stats/types';
import type { Database } from '../../db/client';
import { originalFile } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { countFacts, type CountFacts } from './count-facts';
import { misfits } from './misfits';
import { readFile } from './read-file';
import type { SavedDatasets, SaveTrouble } from './save-datasets';

/** One dataset ready to be saved. */
export interface PartToSave {
  fileId: string;
  index: number;
  /** Its name in a file of several; null for the only one. */
  part: string | null;
  choices: ReadingChoices;
  again: boolean;
  facts: CountFacts;
  conditions: Conditions;
}

/** Reads the files of a request again and picks what is to be saved: what counts is the file, not what a page sends. */
export function partsToSave(
  db: Database,
  actor: Actor,
  request: SaveRequest
): { ok: true; parts: PartToSave[] } | Extract<SavedDatasets, { ok: false }> {
  const parts: PartToSave[] = [];
  const troubles: SaveTrouble[] = [];
  for (const { fileId, choices, again, datasets } of request.files) {
    const found = db
      .select({ name: originalFile.name, bytes: originalFile.bytes })
      .from(originalFile)
      .where(and(eq(originalFile.id, fileId), mayWhere(actor, 'upload', originalFile.teamId)))
      .get();
    if (!found) return { ok: false, reason: 'unknown-file' };
    const read = readFile(found.bytes, found.name, choices);
    if (!read.ok) return { ok: false, reason: 'unreadable' };
    const seen = new Set<number>();
    for (const { index, conditions } of datasets) {
      const one = read.datasets[index];
      if (!one || seen.has(index)) return { ok: false, reason: 'no-such-dataset' };
      seen.add(index);
      try {
        const facts = countFacts(one.data);
        const problems = misfits(conditions, one.data);
        if (Object.keys(problems).length > 0) troubles.push({ fileId, index, problems });
        const part = read.datasets.length > 1 ? one.name : null;
        parts.push({ fileId, index, part, choices, again, facts, conditions });
      } catch (error) {
        if (error instanceof BadInput) return { ok: false, reason: 'unreadable' };
        throw error;
      }
    }
  }
  return troubles.length > 0 ? { ok: false, reason: 'bad-conditions', troubles } : { ok: true, parts };
}
