import type { Histogram } from '../../stats/types';
import { HistogramBuilder } from '../histogram-builder';
import { readLump } from '../number/read-lump';
import { readOpening } from '../number/read-opening';
import { readWholeNumber } from '../number/read-whole-number';
import { trialsLimit } from '../trials-limit';
import type { Suggested } from '../types';
import { jsonStyle, type JsonReader } from './json-reader';
import { describe, type JsonNode } from './node';

/** True for a label of a count: digits, or the label of a lump. */
export function isCountLabel(key: string): boolean {
  return (
    readWholeNumber(key, jsonStyle).ok || (readLump(key, jsonStyle) ?? readOpening(key, jsonStyle)) !== null
  );
}

/**
 * A histogram from an object `{"0": 12, "10+": 3}` or a list of pairs `[[0, 12], ["10+", 3]]`.
 *
 * @param lumps further rows `{"from": 10, "shots": 3}` and `{"to": 2, "shots": 5}`, as the diagnosis document writes them.
 */
export function readHistogram(
  reader: JsonReader,
  node: JsonNode,
  suggested: Suggested,
  lumps: { kind: 'lump' | 'below'; count: number; shots: number; at: number }[] = []
): Histogram {
  const builder = new HistogramBuilder(reader.source.problems, trialsLimit(reader.source.options, suggested));
  const add = (label: string, at: number, value: JsonNode) => {
    const plain = readWholeNumber(label, jsonStyle).ok;
    const from = plain ? null : readLump(label, jsonStyle);
    const to = plain || from !== null ? null : readOpening(label, jsonStyle);
    const count = from ?? to ?? reader.text(label, at, 'counts');
    const shots = reader.whole(value, 'numbers of shots');
    const kind = from !== null ? 'lump' : to !== null ? 'below' : 'one';
    if (count !== null && shots !== null) builder.add(count, shots, kind, () => reader.place(at));
  };
  if (node.kind === 'object') {
    for (const { key, at, value } of node.members) add(key, at, value);
  } else if (node.kind === 'array') {
    for (const item of node.items) {
      const pair = item.kind === 'array' && item.items.length === 2 ? item.items : null;
      const [label] = pair ?? [];
      if (!pair || (label.kind !== 'number' && label.kind !== 'string')) {
        const found = item.kind === 'array' ? `a list of ${item.items.length}` : describe(item);
        reader.problem(
          item.at,
          `Here stands ${found}, not a pair.`,
          'Give pairs: [[count, number of shots], …].'
        );
      } else add(label.kind === 'number' ? label.raw : label.value, label.at, pair[1]);
    }
  }
  for (const { kind, count, shots, at } of lumps) builder.add(count, shots, kind, () => reader.place(at));
  const data = builder.finish('', reader.place(node.at).line, !reader.source.problems.any);
  reader.source.reading.lump ??= builder.lumped;
  if (builder.opened) reader.source.reading.below ??= builder.opened;
  reader.source.reading.rows += data.counts.length;
  return data;
}
