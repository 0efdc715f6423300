import { defaultMaxBytes } from '../../../formats/limits';
import type { Dataset } from '../../../formats/types';
import type { FileProblem } from '../../../model/team/datasets/preview';
import type { ReadingChoices } from '../../../model/team/datasets/reading-choices';
import { BadInput } from '../../../stats/types';
import { countFacts } from './count-facts';
import { readFile } from './read-file';

export type ReadOne =
  | { ok: true; dataset: Dataset }
  | { ok: false; reason: 'too-large' | 'empty' }
  | { ok: false; reason: 'unreadable'; problems: FileProblem[]; more: number }
  | { ok: false; reason: 'several'; datasets: number };

/** The one dataset of a file, fit to be diagnosed; or why there is not just one. */
export function readOne(bytes: Uint8Array, fileName: string, choices: ReadingChoices): ReadOne {
  if (bytes.length > defaultMaxBytes) return { ok: false, reason: 'too-large' };
  if (bytes.length === 0) return { ok: false, reason: 'empty' };
  const read = readFile(bytes, fileName, choices);
  if (!read.ok) return { ok: false, reason: 'unreadable', problems: read.problems, more: read.more };
  if (read.datasets.length > 1) return { ok: false, reason: 'several', datasets: read.datasets.length };
  const [dataset] = read.datasets;
  try {
    countFacts(dataset.data);
  } catch (error) {
    if (!(error instanceof BadInput)) throw error;
    const problem = { line: null, column: null, message: error.reason, fix: 'Correct the counts.' };
    return { ok: false, reason: 'unreadable', problems: [problem], more: 0 };
  }
  return { ok: true, dataset };
}
