/** A text made ready for the table parser: same lines, comments emptied. */
export interface CleanText {
  text: string;
  commentLines: number;
  /** Last comment line before the first line of data, without its `#`; column names may stand there. */
  lastComment: string | null;
  /** First lines that hold data. */
  head: string[];
}

/** Lines looked at before the separator and the columns are decided. */
const headLines = 200;

/**
 * Empties comment lines (first character `#`), so that a stray
 * quotation mark in a comment cannot swallow the lines below it. Line numbers stay as they were.
 *
 * @param raw with `\n` line ends.
 */
export function cleanText(raw: string): CleanText {
  let text = raw;
  let commentLines = 0;
  let lastComment: string | null = null;
  const head: string[] = [];
  let start = 0;
  while (start < text.length && head.length < headLines) {
    const end = text.indexOf('\n', start);
    const line = text.slice(start, end === -1 ? undefined : end).trim();
    if (line.startsWith('#')) {
      if (head.length === 0) lastComment = line.replace(/^#+\s*/, '');
    } else if (line !== '') head.push(line);
    start = end === -1 ? text.length : end + 1;
  }
  if (text.includes('#')) {
    text = text.replace(/(^|\n)[^\S\n]*#[^\n]*/g, (_, lineEnd: string) => {
      commentLines += 1;
      return lineEnd;
    });
  }
  return { text, commentLines, lastComment, head };
}
