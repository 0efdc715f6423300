import type { Histogram } from '../../stats/types';
import { HistogramBuilder } from '../histogram-builder';
import { readLump } from '../number/read-lump';
import { readWholeNumber } from '../number/read-whole-number';
import { trialsLimit } from '../trials-limit';
import type { Suggested } from '../types';
import { jsonStyle, type JsonReader } from './json-reader';
import { describe, type JsonNode } from './node';

/** True for a label of a count: digits, or the label of a lump. */
export function isCountLabel(key: string): boolean {
  return readWholeNumber(key, jsonStyle).ok || readLump(key, jsonStyle) !== null;
}

/**
 * A histogram from an object `{"0": 12, "10+": 3}` or a list of pairs `[[0, 12], ["10+", 3]]`.
 *
 * @param lump further lump `{"from": 10, "shots": 3}`, as the diagnosis document writes it.
 */
export function readHistogram(
  reader: JsonReader,
  node: JsonNode,
  suggested: Suggested,
  lump: { from: number; shots: number; at: number } | null = null
): Histogram {
  const builder = new HistogramBuilder(reader.source.problems, trialsLimit(reader.source.options, suggested));
  const add = (label: string, at: number, value: JsonNode) => {
    const from = readWholeNumber(label, jsonStyle).ok ? null : readLump(label, jsonStyle);
    const count = from ?? reader.text(label, at, 'counts');
    const shots = reader.whole(value, 'numbers of shots');
    if (count !== null && shots !== null) builder.add(count, shots, from !== null, () => reader.place(at));
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
  if (lump) builder.add(lump.from, lump.shots, true, () => reader.place(lump.at));
  const data = builder.finish('', reader.place(node.at).line, !reader.source.problems.any);
  reader.source.reading.lump ??= builder.lumped;
  reader.source.reading.rows += data.counts.length;
  return data;
}
