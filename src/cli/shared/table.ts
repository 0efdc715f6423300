/** A plain table: first column to the left, the others to the right, two blanks between. */
export function table(head: string[], rows: string[][]): string {
  const all = [head, ...rows];
  const widths = head.map((_, column) => Math.max(...all.map((row) => row[column].length)));
  return all
    .map((row) =>
      row
        .map((cell, column) => (column === 0 ? cell.padEnd(widths[column]) : cell.padStart(widths[column])))
        .join('  ')
        .trimEnd()
    )
    .join('\n');
}
