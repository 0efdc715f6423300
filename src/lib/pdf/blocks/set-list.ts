import type { Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { mark, tag, type Element } from '../page/tags';
import { cleanText } from '../type/clean-text';
import { STYLES } from '../type/styles';
import { baseline, setLines } from './set-lines';

const INDENT = 11;

/** A list with dashes. */
export function setList(flow: Flow, items: string[], parent: Element): void {
  const list = tag(flow.doc, parent, 'L');
  const style = STYLES.body;
  for (const item of items) {
    flow.need(style.leading);
    const entry = tag(flow.doc, list, 'LI');
    mark(flow.doc, tag(flow.doc, entry, 'Lbl'), 'Lbl', () => {
      flow.pen.place('–', PAGE.left, flow.y + baseline(style), style);
    });
    const spans = [{ text: cleanText(item), style }];
    setLines(flow, tag(flow.doc, entry, 'LBody'), 'LBody', spans, PAGE.left + INDENT, PAGE.main - INDENT);
    flow.y += 2;
  }
}
