/** Width of plain text: a terminal of 80 columns and a mail both show it whole. */
export const textWidth = 80;

/**
 * Breaks a sentence into lines of at most {@link textWidth} characters, at plain spaces only: the
 * thin and no-break spaces inside numbers hold them together. A word longer than a line stays whole.
 *
 * @param first what stands in front of the first line, such as "  – ".
 * @param rest what stands in front of the others; as many blanks as `first` is long unless given.
 */
export function wrap(text: string, first = '', rest = ' '.repeat(first.length)): string {
  const lines: string[] = [];
  let line = first;
  let empty = true;
  // "p = 0.02" and "2 × 10⁻⁷" are one word each: half of them at a line's end is hard to read.
  const words = text.replace(/ ([=≤≥×]) /g, '\u0000$1\u0000').split(' ');
  for (const part of words.filter((found) => found !== '')) {
    const word = part.replaceAll('\u0000', ' ');
    if (!empty && line.length + 1 + word.length > textWidth) {
      lines.push(line);
      line = rest;
      empty = true;
    }
    line += empty ? word : ` ${word}`;
    empty = false;
  }
  lines.push(line);
  return lines.join('\n');
}
