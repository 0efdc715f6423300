import { alignedColumn } from '$lib/charts/aligned-column';
import type { Table } from '$lib/charts/table';
import { PAGE } from '../page/geometry';
import { breakLines, type Line } from '../type/break-lines';
import type { Pen } from '../type/pen';
import type { Digits } from './blocks';
import { STYLES, type Style } from '../type/styles';

export interface TableColumn {
  x: number;
  width: number;
  numeric: boolean;
  head: Line[];
  cells: string[];
  style: Style;
}

export interface TableLayout {
  columns: TableColumn[];
  width: number;
  /** True when the table needs the margin column too. */
  wide: boolean;
  cellHead: Style;
}

const GAP = { least: 9, most: 26 };

/** Widths of the columns of a table: as narrow as their cells and the longest word of their heading. */
export function tableLayout(table: Table, digits: Digits | undefined, pen: Pen): TableLayout {
  for (const scale of [1, 0.92, 0.84, 0.76]) {
    const layout = attempt(table, digits, scale, pen);
    if (layout.width <= PAGE.whole || scale === 0.76) return layout;
  }
  return attempt(table, digits, 0.7, pen);
}

function attempt(table: Table, digits: Digits | undefined, scale: number, pen: Pen): TableLayout {
  const scaled = (style: Style): Style => ({ ...style, size: style.size * scale });
  const [cell, amount, cellHead] = [STYLES.cell, STYLES.amount, STYLES.cellHead].map(scaled);
  const columns = table.columns.map(({ title, kind }, i) => {
    const numeric = kind !== 'text';
    const style = numeric ? amount : cell;
    const cells = alignedColumn(
      table.rows.map((row) => row[i]),
      kind,
      Array.isArray(digits) ? digits[i] : digits
    );
    const longest = Math.max(...title.split(' ').map((word) => pen.width(word, cellHead)));
    const whole = title.split(' ').length > 2 ? longest : pen.width(title, cellHead);
    const width = Math.max(whole, ...cells.map((text) => pen.width(text, style)), 12);
    const head = breakLines([{ text: title, style: cellHead }], width, pen);
    return { x: 0, width, numeric, head, cells, style };
  });
  const cellsWidth = columns.reduce((sum, { width }) => sum + width, 0);
  const gaps = Math.max(1, columns.length - 1);
  const least = cellsWidth + gaps * GAP.least;
  const wide = least > PAGE.main;
  const gap = Math.min(GAP.most, Math.max(GAP.least, ((wide ? PAGE.whole : PAGE.main) - cellsWidth) / gaps));
  let x = 0;
  for (const column of columns) {
    column.x = x;
    x += column.width + gap;
  }
  return { columns, width: x - gap, wide, cellHead };
}
