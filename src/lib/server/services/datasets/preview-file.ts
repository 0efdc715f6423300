import { and, eq } from 'drizzle-orm';
import { recogniseConditions } from '../../../formats/conditions/recognise-conditions';
import type { Reading } from '../../../formats/types';
import type { FileProblem, Preview, PreviewDataset } from '../../../model/team/datasets/preview';
import type { ReadingChoices } from '../../../model/team/datasets/reading-choices';
import { BadInput } from '../../../stats/types';
import type { Database } from '../../db/client';
import { originalFile } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { countFacts } from './count-facts';
import { namesOfParts } from './names-of-parts';
import { readFile } from './read-file';
import { savedBefore } from './saved-before';

export type PreviewOfFile = { ok: true; preview: Preview<Reading> } | { ok: false; reason: 'unknown' };

/** What a stored file would become: its datasets with the conditions its columns state, or its problems by line. */
export function previewFile(
  db: Database,
  actor: Actor,
  fileId: string,
  choices: ReadingChoices
): PreviewOfFile {
  const found = db
    .select()
    .from(originalFile)
    .where(and(eq(originalFile.id, fileId), mayWhere(actor, 'upload', originalFile.teamId)))
    .get();
  if (!found) return { ok: false, reason: 'unknown' };
  const { id, name, size, sha256, bytes } = found;
  const file = { id, name, size, sha256 };
  const read = readFile(bytes, name, choices);
  const { reading } = read;
  if (!read.ok) {
    const { problems, more } = read;
    return { ok: true, preview: { file, choices, reading, notes: [], datasets: [], problems, more } };
  }
  const problems: FileProblem[] = [];
  const several = read.datasets.length > 1;
  const facts = read.datasets.map(({ data, name: part }) => {
    try {
      return countFacts(data);
    } catch (error) {
      if (!(error instanceof BadInput)) throw error;
      const message = several ? `${part}: ${error.reason}` : error.reason;
      problems.push({ line: null, column: null, message, fix: 'Correct the file, or how it is read.' });
      return null;
    }
  });
  const names = namesOfParts(read.datasets);
  const before = savedBefore(
    db,
    actor,
    facts.flatMap((one) => one?.digest ?? [])
  );
  const datasets = read.datasets.flatMap((dataset, index): PreviewDataset[] => {
    const one = facts[index];
    if (!one) return [];
    const { kind, shots, mean, smallest, largest, open, opening, batches, digest } = one;
    const shown = { kind, shots, mean, smallest, largest, open, opening, batches };
    const { conditions, said } = recogniseConditions(dataset, names[index]);
    const there = before(digest, id, several ? dataset.name : null);
    return [{ index, ...shown, conditions, recognised: said, ...there }];
  });
  return {
    ok: true,
    preview: {
      file,
      choices,
      reading,
      notes: read.notes,
      datasets,
      problems: problems.slice(0, 20),
      more: Math.max(0, problems.length - 20)
    }
  };
}
