import type { ShotList } from '../../stats/types';
import { maxCount } from '../limits';
import { trialsLimit } from '../trials-limit';
import type { Suggested } from '../types';
import type { JsonReader } from './json-reader';
import { describe, type JsonNode } from './node';

/** A shot list from a list of counts and, if given, a list with the batch of each. */
export function readShotList(
  reader: JsonReader,
  node: JsonNode & { kind: 'array' },
  batches: JsonNode | null,
  suggested: Suggested
): ShotList {
  const { trials, why } = trialsLimit(reader.source.options, suggested);
  const shots = new Uint32Array(node.items.length);
  for (const [index, item] of node.items.entries()) {
    const count = reader.whole(item, 'counts of single shots');
    if (count === null) continue;
    if (trials !== null && count > trials) {
      reader.problem(
        item.at,
        `The count ${count} is above the ${trials} ${trials === 1 ? 'trial' : 'trials'} ${why}.`,
        'Correct the count, or the number of trials.'
      );
    } else if (count > maxCount) {
      reader.problem(item.at, `The count ${count} is too large.`, `Counts go up to ${maxCount}.`);
    } else shots[index] = count;
  }
  if (shots.length === 0) reader.problem(node.at, 'There are no shots.', 'Give at least one count.');
  reader.source.reading.rows += shots.length;
  return { kind: 'shots', shots, batches: readBatches(reader, batches, shots.length) };
}

function readBatches(reader: JsonReader, node: JsonNode | null, wanted: number): string[] | null {
  if (!node || (node.kind === 'literal' && node.value === null)) return null;
  if (node.kind !== 'array' || node.items.length !== wanted) {
    const found = node.kind === 'array' ? `a list of ${node.items.length}` : describe(node);
    reader.problem(node.at, `"batches" is ${found}.`, `Give the batch of each shot: a list of ${wanted}.`);
    return null;
  }
  return node.items.map((item) => {
    if (item.kind === 'string') return item.value;
    if (item.kind === 'number') return item.raw;
    reader.problem(item.at, `The name of a batch is ${describe(item)}.`, 'Give a text or a number.');
    return '';
  });
}
