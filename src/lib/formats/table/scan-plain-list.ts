/** A long list read without the table parser. */
export interface PlainList {
  values: Uint32Array;
  blankLines: number;
  commentLines: number;
}

/**
 * Reads a text in which every line from `firstLine` on is a whole number of at most nine digits,
 * blank, or a comment; about 30 times faster than the table parser and without an object a line.
 *
 * @param text with `\n` line ends.
 * @param firstLine line of the first number, from 1; lines above are counted as blank, comment or neither.
 * @param largest largest value allowed.
 * @returns null as soon as one line is anything else; the table parser then says what it is.
 */
export function scanPlainList(text: string, firstLine: number, largest: number): PlainList | null {
  let values = new Uint32Array(1 << 16);
  let length = 0;
  let blankLines = 0;
  let commentLines = 0;
  let line = 1;
  let at = 0;
  while (at < text.length) {
    let value = 0;
    let digits = 0;
    let code = text.charCodeAt(at);
    while (code === 32 || code === 9) code = text.charCodeAt((at += 1));
    while (code >= 48 && code <= 57) {
      value = value * 10 + code - 48;
      digits += 1;
      code = text.charCodeAt((at += 1));
    }
    while (code === 32 || code === 9) code = text.charCodeAt((at += 1));
    const ended = at >= text.length || code === 10;
    if (!ended && digits === 0 && (code === 35 || line < firstLine)) {
      if (code === 35) commentLines += 1;
      const end = text.indexOf('\n', at);
      at = end === -1 ? text.length : end;
    } else if (!ended || digits > 9 || value > largest || (digits > 0 && line < firstLine)) return null;
    else if (digits === 0) blankLines += 1;
    else {
      if (length === values.length) {
        const larger = new Uint32Array(2 * length);
        larger.set(values);
        values = larger;
      }
      values[length] = value;
      length += 1;
    }
    at += 1;
    line += 1;
  }
  return { values: values.slice(0, length), blankLines, commentLines };
}
