import { afterBlanks, afterLineEnd, endOfComment } from './plain-line';
import { plainRun } from './plain-run';

/** A long list read without the table parser. */
export interface PlainList {
  values: Uint32Array;
  blankLines: number;
  commentLines: number;
}

const lineFeed = 10;
const carriageReturn = 13;
const hash = 35;

/**
 * Reads bytes in which every line from `firstLine` on is a whole number of at most nine digits, blank, or a comment,
 * without a string or an object a line.
 *
 * @param bytes UTF-8 or anything else that agrees with ASCII below 128; line ends of any kind; no mark in front.
 * @param firstLine line of the first number, from 1; of the lines above, all but `names` must be blank or comments.
 * @param names 1 where one of them names the column, else 0.
 * @param largest largest value allowed.
 * @param decoded whether somebody saw that the bytes are text. If not, a comment below `firstLine` may hold printable
 *   ASCII alone: other bytes might be no text at all.
 * @returns null as soon as one line is anything else; the table parser then says what it is.
 */
export function scanPlainList(
  bytes: Uint8Array,
  firstLine: number,
  names: number,
  largest: number,
  decoded: boolean
): PlainList | null {
  const end = bytes.length;
  let blankLines = 0;
  let commentLines = 0;
  let words = 0;
  const run = { at: 0, values: new Uint32Array(likelyLines(bytes)), length: 0 };
  for (let line = 1; line < firstLine && run.at < end; line += 1) {
    const at = afterBlanks(bytes, run.at);
    const code = bytes[at];
    if (at >= end || code === lineFeed || code === carriageReturn) blankLines += 1;
    else if (code === hash) commentLines += 1;
    else words += 1;
    run.at = afterLineEnd(bytes, endOfComment(bytes, at, true));
  }
  if (words !== names) return null;
  while (run.at < end) {
    plainRun(bytes, run, largest);
    if (run.at >= end) break;
    // What the run left: blanks around the number, another line end, no number, or a line that is not plain.
    let at = afterBlanks(bytes, run.at);
    const from = at;
    let value = 0;
    for (; bytes[at] >= 48 && bytes[at] <= 57; at += 1) value = value * 10 + bytes[at] - 48;
    if (at > from) {
      if (at - from > 9 || value > largest) return null;
      run.values[run.length] = value;
      run.length += 1;
      at = afterBlanks(bytes, at);
    } else if (bytes[at] === hash) {
      commentLines += 1;
      at = endOfComment(bytes, at, decoded);
    } else if (at < end) blankLines += 1;
    if (at < end && bytes[at] !== lineFeed && bytes[at] !== carriageReturn) return null;
    run.at = afterLineEnd(bytes, at);
  }
  // What is left over is a few per cent, or was never touched: cheaper to keep than to copy the rest.
  return { values: run.values.subarray(0, run.length), blankLines, commentLines };
}

/** Lines that the bytes hold if all are like the first ones, and two in a hundred more. */
function likelyLines(bytes: Uint8Array): number {
  const sample = bytes.subarray(0, 65_536);
  let lines = 1;
  for (const code of sample) if (code === lineFeed || code === carriageReturn) lines += 1;
  return Math.ceil((1.02 * lines * bytes.length) / Math.max(1, sample.length)) + 1;
}
