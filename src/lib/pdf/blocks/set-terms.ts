import type { Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { tag, type Element } from '../page/tags';
import { STYLES } from '../type/styles';
import type { Block } from './blocks';
import { setLines } from './set-lines';
import { spansOf } from './set-paragraph';

/** Terms, each over what is said of it in paragraphs. */
export function setTerms(flow: Flow, { terms }: Block & { kind: 'terms' }, parent: Element): void {
  for (const { term, words } of terms) {
    flow.need(3 * STYLES.term.leading);
    const heading = [{ text: term, style: STYLES.termName }];
    setLines(flow, tag(flow.doc, parent, 'H2'), 'H2', heading, PAGE.left, PAGE.main);
    words.forEach((paragraph, i) => {
      if (i > 0) flow.skip(2.2);
      const spans = spansOf(paragraph, STYLES.term);
      setLines(flow, tag(flow.doc, parent, 'P'), 'P', spans, PAGE.left, PAGE.main);
    });
    flow.skip(6);
  }
}
