import { json } from '../json';
import { Source } from '../source';
import { decode } from '../text/decode';
import { looksLikeMarkup } from '../text/looks-like-markup';
import { oneKindOfLineEnd } from '../text/one-kind-of-line-end';
import type { Encoding, Guess, ReadOptions } from '../types';
import type { Table } from './read-table';
import { scanPlainList } from './scan-plain-list';

/** Inputs of fewer bytes go through the table parser whatever they hold; it takes 10 ms. */
const longInput = 300_000;
/** Bytes of which text is made. */
const headBytes = 65_536;
/** Characters from which everything is decided: 1 ms, and ten times that only where a long remark comes first. */
const headLengths = [2_000, 20_000];

/**
 * A long list of one plain count a line, its table read without making text of more than its head: everything is
 * decided from that as from a short file, and the rest is scanned byte by byte.
 *
 * @param bytes the whole input
 * @param options what the person settled
 * @param decoded the encoding, where the input was decoded before and `bytes` are its text in UTF-8; left out, bytes
 *   that are not plainly UTF-8 are left alone
 * @returns a source whose table holds all counts and for which there are no problems; null for anything else, which
 *   then has to be read in the ordinary way. Both ways give the same answer.
 */
export function plainSource(
  bytes: Uint8Array,
  options: ReadOptions,
  decoded?: Guess<Encoding>
): Source | null {
  const { format = 'auto', trials } = options;
  if (bytes.length <= longInput || (format !== 'auto' && format !== 'shots')) return null;
  const opening = bytes.subarray(0, headBytes);
  const head = decode(
    opening.subarray(0, Math.max(opening.lastIndexOf(10), opening.lastIndexOf(13)) + 1),
    decoded ? 'utf-8' : options.encoding
  );
  if (!head.ok || head.encoding.value !== 'utf-8') return null;
  const decision = decide(oneKindOfLineEnd(head.text), options);
  if (!decision) return null;
  const { source, table } = decision;
  const marked = bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf;
  const scanned = scanPlainList(
    marked ? bytes.subarray(3) : bytes,
    table.sheet.lines[0],
    source.reading.header?.value ? 1 : 0,
    trials ?? Infinity,
    decoded !== undefined
  );
  if (!scanned) return null;
  const { values, blankLines, commentLines } = scanned;
  table.plain = values;
  Object.assign(source.reading, {
    encoding: decoded ?? head.encoding,
    rows: values.length,
    blankLines,
    commentLines
  });
  return source;
}

/** The first lines as a source of their own, if they are a shot list of one column; else null. */
function decide(text: string, options: ReadOptions): { source: Source; table: Table } | null {
  for (const length of headLengths) {
    // A plain list is limited by its bytes alone.
    const free = { ...options, maxRows: Infinity };
    const source = new Source(text.slice(0, text.lastIndexOf('\n', length) + 1), free);
    if (looksLikeMarkup(source.text) || json.claims(source)) return null;
    const table = source.table();
    if (!table || source.problems.any || table.format.value !== 'shots') continue;
    const single = table.sheet.width === 1 && !table.sheet.turned;
    return single && source.reading.columns[0].role.value === 'count' ? { source, table } : null;
  }
  return null;
}
