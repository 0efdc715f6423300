import type { Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { rule } from '../page/rule';
import { tag, tagged, type Element } from '../page/tags';
import { cleanText } from '../type/clean-text';
import { STYLES } from '../type/styles';
import type { Block } from './blocks';
import { baseline, setLines } from './set-lines';

/** The head of the first page: whose report, of which counts. */
export function setMasthead(flow: Flow, { name, line }: Block & { kind: 'masthead' }, parent: Element): void {
  const { doc, pen } = flow;
  const style = STYLES.wordmark;
  tagged(flow, parent, 'P', () => {
    const end = pen.place('Severalty', PAGE.left, flow.y + baseline(style), style);
    pen.place(' ', end, flow.y + baseline(style), style);
    const width = pen.width(line, STYLES.smallFaint);
    pen.place(line, PAGE.left + PAGE.whole - width, flow.y + baseline(style), STYLES.smallFaint);
  });
  flow.y += style.leading + 4;
  rule(doc, PAGE.left, flow.y, PAGE.whole, 'ink', 0.9);
  flow.y += 9;
  if (name !== null) {
    const spans = [{ text: cleanText(name), style: STYLES.body }];
    setLines(flow, tag(doc, parent, 'P'), 'P', spans, PAGE.left, PAGE.main);
    flow.y += 5;
  }
}
