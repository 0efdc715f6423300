import { conditionOfName } from '../../../formats/conditions/condition-of-name';
import { readCounts } from '../../../formats/read-counts';
import type { ReadResult } from '../../../formats/types';
import type { ReadingChoices } from '../../../model/team/datasets/reading-choices';

/**
 * Reads an uploaded file as the first page would, and once more when a column that tells no datasets apart still
 * states a condition, such as notes: it is taken in where that changes nothing about the counts.
 *
 * @param fileName gives a dataset without a name its own
 */
export function readFile(bytes: Uint8Array, fileName: string, choices: ReadingChoices): ReadResult {
  const result = readCounts(bytes, choices);
  if (!result.ok) return result;
  const more = result.reading.columns.flatMap(({ column, name, role }) =>
    name !== null && role.value === 'ignored' && role.from === 'guessed' && conditionOfName(name) !== null
      ? [{ column, role: 'condition' as const }]
      : []
  );
  const again =
    more.length > 0
      ? readCounts(bytes, { ...choices, columns: [...(choices.columns ?? []), ...more] })
      : null;
  const taken = again?.ok && again.datasets.length === result.datasets.length ? again : result;
  for (const dataset of taken.datasets) if (dataset.name === 'counts') dataset.name = stem(fileName);
  return taken;
}

const stem = (fileName: string): string => fileName.replace(/\.[^.]{1,8}$/, '') || 'counts';
