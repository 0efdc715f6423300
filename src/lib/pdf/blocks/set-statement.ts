import type { Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { tag, type Element } from '../page/tags';
import { cleanText } from '../type/clean-text';
import { STYLES } from '../type/styles';
import { setLines } from './set-lines';

/** An answer that has no verdict's mark: the title of the document. */
export function setStatement(flow: Flow, text: string, parent: Element): void {
  const spans = [{ text: cleanText(text), style: STYLES.answer }];
  setLines(flow, tag(flow.doc, parent, 'H1'), 'H1', spans, PAGE.left, PAGE.main);
  flow.y += 7;
}
