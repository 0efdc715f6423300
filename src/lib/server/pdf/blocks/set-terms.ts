import type { Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { mark, tag, type Element } from '../page/tags';
import { breakLines } from '../type/break-lines';
import { STYLES } from '../type/styles';
import type { Block } from './blocks';
import { placeLine, setLines } from './set-lines';
import { spansOf } from './set-paragraph';

const TERM = 66;

/** A term at the left, what is said of it in paragraphs at the right. */
export function setTerms(flow: Flow, { terms }: Block & { kind: 'terms' }, parent: Element): void {
  const list = tag(flow.doc, parent, 'L');
  for (const { term, words } of terms) {
    const label = breakLines([{ text: term, style: STYLES.strong }], TERM - 6, flow.pen);
    flow.need(Math.max(2, label.length) * STYLES.body.leading);
    const entry = tag(flow.doc, list, 'LI');
    const top = flow.y;
    const page = flow.pageNumber;
    mark(flow.doc, tag(flow.doc, entry, 'Lbl'), 'Lbl', () =>
      label.forEach((line, i) => placeLine(line, PAGE.left, top + i * STYLES.strong.leading, TERM, flow.pen))
    );
    const body = tag(flow.doc, entry, 'LBody');
    words.forEach((paragraph, i) => {
      if (i > 0) flow.skip(2.5);
      const spans = spansOf(paragraph, STYLES.body);
      setLines(flow, tag(flow.doc, body, 'P'), 'P', spans, PAGE.left + TERM, PAGE.main - TERM);
    });
    const least = top + label.length * STYLES.strong.leading;
    if (flow.pageNumber === page) flow.y = Math.max(flow.y, least);
    flow.y += 5;
  }
}
