/**
 * Place of an offset in a text, both from 1; lines end in `\n`. Costs one pass up to the offset,
 * so it is asked for problems only.
 */
export function placeOf(text: string, offset: number): { line: number; column: number } {
  let line = 1;
  let start = 0;
  for (;;) {
    const end = text.indexOf('\n', start);
    if (end === -1 || end >= offset) return { line, column: offset - start + 1 };
    start = end + 1;
    line += 1;
  }
}

/** Text of one line, counted from 1, without its ending; empty past the last line. */
export function lineText(text: string, line: number): string {
  let start = 0;
  for (let passed = 1; passed < line; passed += 1) {
    const end = text.indexOf('\n', start);
    if (end === -1) return '';
    start = end + 1;
  }
  const end = text.indexOf('\n', start);
  return text.slice(start, end === -1 ? undefined : end);
}
