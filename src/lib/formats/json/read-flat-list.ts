import type { Dataset, FormatId } from '../types';
import type { JsonReader } from './json-reader';
import type { JsonNode } from './node';
import { readHistogram } from './read-histogram';
import { readShotList } from './read-shot-list';

/** What to give when a JSON text is of no known shape. */
export const expected = 'Give {"counts": {"0": 12, "1": 30}}, [[0, 12], [1, 30]] or {"shots": [0, 1, 1]}.';

/** A flat list may be one count a shot or numbers of shots by position: read only when told which. */
export function readFlatList(
  reader: JsonReader,
  node: JsonNode & { kind: 'array' },
  asked: FormatId | 'auto'
): Dataset | null {
  const base = { name: reader.source.name, conditions: {}, suggested: {} };
  if (asked === 'shots') return { ...base, data: readShotList(reader, node, null, {}) };
  if (asked === 'positions') return { ...base, data: readHistogram(reader, byPosition(node), {}) };
  if (node.items.some(({ kind }) => kind === 'object')) {
    reader.problem(node.at, 'A list of objects is not read.', expected);
  } else {
    reader.problem(
      node.at,
      'A plain list of numbers can be read two ways: as one count a shot, or as numbers of shots with 0, 1, 2 … defects.',
      'Say which: a shot list (shots), or numbers of shots by position (positions); or give {"shots": […]}.'
    );
  }
  return null;
}

function byPosition(node: JsonNode & { kind: 'array' }): JsonNode {
  const pair = (item: JsonNode, index: number): JsonNode => ({
    kind: 'array',
    at: item.at,
    items: [{ kind: 'number', at: item.at, raw: String(index) }, item]
  });
  return { kind: 'array', at: node.at, items: node.items.map(pair) };
}
