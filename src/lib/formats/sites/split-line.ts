/** A cell and the column, from 1, of its first character. */
export interface Cell {
  text: string;
  column: number;
}

/**
 * Cells of one line. A comma, semicolon or tab in the line separates, and empty cells are kept; with none of them,
 * runs of spaces do.
 */
export function splitLine(line: string): Cell[] {
  if (!/[,;\t]/.test(line)) {
    return Array.from(line.matchAll(/\S+/g), (found) => ({ text: found[0], column: found.index + 1 }));
  }
  const mark = line.includes('\t') ? '\t' : line.includes(';') ? ';' : ',';
  const cells: Cell[] = [];
  let start = 0;
  for (const part of line.split(mark)) {
    const text = part.trim();
    cells.push({ text, column: start + (part.length - part.trimStart().length) + 1 });
    start += part.length + 1;
  }
  return cells;
}
