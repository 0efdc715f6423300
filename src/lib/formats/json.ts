import { defaultMaxRows } from './limits';
import type { Format } from './format';
import { readFlatList } from './json/read-flat-list';
import { readRoot } from './json/read-root';
import { JsonReader } from './json/json-reader';
import { parseJson } from './json/parse-json';

/**
 * JSON: `{"counts": {"0": 12, …}}`, `{"counts": [[n, shots], …]}`, `[[n, shots], …]`,
 * `{"shots": [3, 4, …], "batches": […]}`, or a diagnosis document, whose data are read again.
 */
export const json: Format = {
  id: 'json',
  label: 'JSON',
  claims: (source) => /^\s*[[{]/.test(source.text),
  read(source) {
    const asked = source.options.format ?? 'auto';
    source.reading.format ??= {
      value: 'json',
      from: asked === 'json' ? 'given' : 'guessed',
      why: asked === 'json' ? 'as you said' : 'the text opens with a bracket'
    };
    const reader = new JsonReader(source);
    const parsed = parseJson(source.text, source.options.maxRows ?? defaultMaxRows);
    if (!parsed.ok) {
      reader.problem(parsed.error.at, parsed.error.message, parsed.error.fix);
      return { datasets: [], notes: [] };
    }
    const { root } = parsed;
    const notes: string[] = [];
    const flat =
      root.kind === 'array' && root.items.length > 0 && root.items[0].kind !== 'array' ? root : null;
    const dataset = flat ? readFlatList(reader, flat, asked) : readRoot(reader, root, asked, notes);
    if (reader.zeroDecimals > 0) {
      notes.push(
        `${reader.zeroDecimals} of the numbers have decimals, all zero, and are read as whole numbers.`
      );
    }
    return { datasets: dataset ? [dataset] : [], notes };
  }
};
