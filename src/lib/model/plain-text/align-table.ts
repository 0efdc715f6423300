/** A column of a table in plain text: words to the left, numbers on their decimal point. */
export interface TextColumn {
  title: string;
  cells: string[];
  numeric: boolean;
}

/**
 * Sets a table in plain text: numbers stand with their points under each other, columns apart by
 * two blanks, a heading above and two blanks in front.
 */
export function alignTable(columns: TextColumn[]): string {
  const set = columns.map(({ title, cells, numeric }) => {
    const aligned = numeric ? onPoint(cells) : cells;
    const width = Math.max(title.length, ...aligned.map((cell) => cell.length));
    const pad = (cell: string) => (numeric ? cell.padStart(width) : cell.padEnd(width));
    return [pad(title), ...aligned.map(pad)];
  });
  return set[0].map((_, row) => `  ${set.map((column) => column[row]).join('  ')}`.trimEnd()).join('\n');
}

/** Pads each number behind, so that all have as much behind the point as the longest. */
function onPoint(cells: string[]): string[] {
  const behind = cells.map((cell) => {
    const point = cell.search(/\.| ×/);
    return point === -1 ? 0 : cell.length - point;
  });
  const most = Math.max(0, ...behind);
  return cells.map((cell, index) => cell + ' '.repeat(most - behind[index]));
}
