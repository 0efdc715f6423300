import type { CountData } from '../../stats/types';
import type { Dataset, FormatId, Suggested } from '../types';
import type { JsonReader } from './json-reader';
import { type JsonNode, member } from './node';
import { expected, readFlatList } from './read-flat-list';
import { isCountLabel, readHistogram } from './read-histogram';
import { readShotList } from './read-shot-list';
import { readSuggested, suggestedKeys } from './read-suggested';

const known = new Set([
  'counts',
  'shots',
  'batches',
  'lump',
  'below',
  'name',
  'conditions',
  ...suggestedKeys
]);

/** The dataset of a JSON text whose root is an object or a list of pairs; null after a problem. */
export function readRoot(
  reader: JsonReader,
  root: JsonNode,
  asked: FormatId | 'auto',
  notes: string[]
): Dataset | null {
  const name = reader.source.name;
  if (root.kind === 'array')
    return { name, conditions: {}, data: readHistogram(reader, root, {}), suggested: {} };
  if (root.kind !== 'object') {
    reader.problem(root.at, 'The text holds one value, not a histogram.', expected);
    return null;
  }
  const format = member(root, 'format');
  const inner =
    format?.kind === 'string' && format.value.startsWith('severalty.') ? member(root, 'data') : null;
  if (inner) notes.push('This is a diagnosis document; its data are read again.');
  const node = inner?.kind === 'object' ? inner : root;
  if (!refuseRepeats(reader, node)) return null;
  const suggested = readSuggested(reader, node);
  const data = readData(reader, node, suggested, asked);
  if (!data) return null;
  const unused = node.members
    .filter(({ key }) => !known.has(key) && !isCountLabel(key))
    .map(({ key }) => key);
  if (unused.length > 0 && !inner) notes.push(`Not used: ${unused.slice(0, 10).join(', ')}.`);
  const own = member(node, 'name');
  return {
    name: reader.source.options.name ?? (own?.kind === 'string' && own.value !== '' ? own.value : name),
    conditions: readConditions(member(node, 'conditions')),
    data,
    suggested
  };
}

function readData(
  reader: JsonReader,
  node: JsonNode & { kind: 'object' },
  suggested: Suggested,
  asked: FormatId | 'auto'
): CountData | null {
  const counts = member(node, 'counts');
  const shots = member(node, 'shots');
  if (counts) {
    const flat = counts.kind === 'array' && counts.items.length > 0 && counts.items[0].kind !== 'array';
    if (flat) return readFlatList(reader, counts, asked)?.data ?? null;
    if (counts.kind !== 'object' && counts.kind !== 'array') {
      reader.problem(counts.at, '"counts" is neither an object nor a list.', expected);
      return null;
    }
    const data = readHistogram(reader, counts, suggested, [
      ...readLumpMember(reader, member(node, 'lump'), 'lump'),
      ...readLumpMember(reader, member(node, 'below'), 'below')
    ]);
    if (shots) checkTotal(reader, shots, data);
    return data;
  }
  if (shots?.kind === 'array') return readShotList(reader, shots, member(node, 'batches'), suggested);
  const labels = node.members.filter(({ key }) => isCountLabel(key));
  if (labels.length > 0) return readHistogram(reader, { ...node, members: labels }, suggested);
  reader.problem(node.at, 'There is neither "counts" nor a list "shots" in this object.', expected);
  return null;
}

function refuseRepeats(reader: JsonReader, node: JsonNode & { kind: 'object' }): boolean {
  const seen = new Set<string>();
  for (const { key, at } of node.members) {
    if (seen.has(key) && !isCountLabel(key)) {
      reader.problem(at, `The key "${key}" is given twice.`, 'Keep one of them.');
      return false;
    }
    seen.add(key);
  }
  return true;
}

function readLumpMember(
  reader: JsonReader,
  node: JsonNode | null,
  kind: 'lump' | 'below'
): { kind: 'lump' | 'below'; count: number; shots: number; at: number }[] {
  if (!node || (node.kind === 'literal' && node.value === null)) return [];
  const edge = kind === 'lump' ? 'from' : 'to';
  const [end, shots] = [member(node, edge), member(node, 'shots')];
  if (!end || !shots) {
    reader.problem(
      node.at,
      `The ${kind === 'lump' ? 'lump' : 'opening row'} is not understood.`,
      `Give {"${edge}": ${kind === 'lump' ? 10 : 2}, "shots": 18}.`
    );
    return [];
  }
  const [count, number] = [reader.whole(end, 'counts'), reader.whole(shots, 'numbers of shots')];
  return count === null || number === null ? [] : [{ kind, count, shots: number, at: node.at }];
}

/** `"shots": 26306` beside the counts states their sum. */
function checkTotal(reader: JsonReader, node: JsonNode, data: CountData): void {
  if (data.kind !== 'histogram' || reader.source.problems.any) return;
  const stated = reader.whole(node, 'numbers of shots');
  const lumps = (data.lump?.shots ?? 0) + (data.below?.shots ?? 0);
  const sum = data.counts.reduce((total, [, shots]) => total + shots, lumps);
  if (stated !== null && stated !== sum) {
    reader.problem(
      node.at,
      `"shots" says ${stated}, but the counts add up to ${sum}.`,
      'Correct what is wrong, or leave "shots" out.'
    );
  }
}

function readConditions(node: JsonNode | null): Record<string, string> {
  if (node?.kind !== 'object') return {};
  const entries = node.members.flatMap(({ key, value }): [string, string][] => {
    if (value.kind === 'string') return [[key, value.value]];
    return value.kind === 'number' ? [[key, value.raw]] : [];
  });
  return Object.fromEntries(entries);
}
