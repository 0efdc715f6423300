import type { Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { doubleRule, rule } from '../page/rule';
import { adorn, mark, tag, tagged, type Element } from '../page/tags';
import { breakLines } from '../type/break-lines';
import { STYLES } from '../type/styles';
import type { Block } from './blocks';
import { baseline, placeLine } from './set-lines';
import { tableLayout, type TableColumn, type TableLayout } from './table-layout';

const PAD = 1.6;

/** What pdfkit keeps from its types: it has no option for cells that span columns. */
interface Spanning {
  dictionary: { data: Record<string, unknown> };
}

/**
 * A table of figures on the decimal point, as wide as it must be; its heading stands again on every page.
 *
 * @param after points of its foot, which stands on the page of the last row
 */
export function setTable(flow: Flow, block: Block & { kind: 'table' }, parent: Element, after = 0): void {
  const layout = tableLayout(block.table, block.digits, flow.pen);
  if (layout.wide) flow.clearMargin();
  const head =
    Math.max(...layout.columns.map((column) => column.head.length)) * layout.cellHead.leading + 2 * PAD;
  const row = STYLES.amount.leading + 2 * PAD;
  const rows = block.table.rows.length;
  const words = block.under ? STYLES.smallFaint.leading : 0;
  // At least three rows, or all of a short table, under its heading.
  flow.need(STYLES.strong.leading + head + Math.min(rows, rows < 8 ? 8 : 3) * (row + words) + 4);
  const table = tag(flow.doc, parent, 'Table');
  const caption = breakLines([{ text: block.caption, style: STYLES.strong }], PAGE.whole, flow.pen);
  tagged(flow, table, 'Caption', () =>
    caption.forEach((line, i) =>
      placeLine(line, PAGE.left, flow.y + i * STYLES.strong.leading, PAGE.whole, flow.pen)
    )
  );
  flow.y += caption.length * STYLES.strong.leading;
  setHead(flow, layout, table, head);
  for (let i = 0; i < rows; i++) {
    const under = block.under?.[i] ?? null;
    const needed = row + (under === null ? 0 : words);
    if (flow.room < needed + 3 + (i === rows - 1 ? after : 0)) {
      doubleRule(flow.doc, PAGE.left, flow.y, layout.width);
      flow.newPage();
      setHead(flow, layout, null, head);
    }
    setRow(flow, layout, table, i, under);
    if (i < rows - 1) rule(flow.doc, PAGE.left, flow.y, layout.width);
  }
  doubleRule(flow.doc, PAGE.left, flow.y, layout.width);
  flow.y += 4;
}

/** Heading of the table; repeated ones are not read out again. */
function setHead(flow: Flow, layout: TableLayout, table: Element | null, height: number): void {
  const bottom = flow.y + height - PAD;
  const draw = ({ x, width, numeric, head }: TableColumn): void =>
    head.forEach((line, i) => {
      const top = bottom - (head.length - i) * layout.cellHead.leading;
      placeLine(line, PAGE.left + x + (numeric ? width - line.width : 0), top, width, flow.pen);
    });
  if (table === null) adorn(flow.doc, () => layout.columns.forEach(draw));
  else {
    const row = tag(flow.doc, table, 'TR');
    for (const column of layout.columns) tagged(flow, row, 'TH', () => draw(column), { scope: 'Column' });
  }
  flow.y += height;
  rule(flow.doc, PAGE.left, flow.y, layout.width, 'ink');
}

function setRow(flow: Flow, layout: TableLayout, table: Element, index: number, under: string | null): void {
  const row = tag(flow.doc, table, 'TR');
  const top = flow.y + PAD;
  layout.columns.forEach(({ x, width, numeric, cells, style }, i) => {
    const text = cells[index];
    const left = PAGE.left + x + (numeric ? width - flow.pen.width(text, style) : 0);
    const draw = (): void => void flow.pen.place(text, left, top + baseline(style), style);
    if (i === 0) tagged(flow, row, 'TH', draw, { scope: 'Row' });
    else tagged(flow, row, 'TD', draw);
  });
  flow.y += STYLES.amount.leading + 2 * PAD;
  if (under === null) return;
  const said = tag(flow.doc, tag(flow.doc, table, 'TR'), 'TD');
  (said as unknown as Spanning).dictionary.data.A = { O: 'Table', ColSpan: layout.columns.length };
  mark(flow.doc, said, 'TD', () => {
    const style = STYLES.smallFaint;
    flow.pen.place(under, PAGE.left, flow.y - PAD + baseline(style), style);
  });
  flow.y += STYLES.smallFaint.leading;
}
