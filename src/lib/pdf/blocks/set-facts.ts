import type { Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { doubleRule, rule } from '../page/rule';
import { mark, tag, type Element } from '../page/tags';
import { breakLines } from '../type/break-lines';
import { cleanText } from '../type/clean-text';
import { STYLES } from '../type/styles';
import { baseline, setLines } from './set-lines';

const TERM = 118;
const PAD = 2.6;

/** A short list of what is what, with a rule above each line and a double one at the end. */
export function setFacts(flow: Flow, facts: [string, string][], parent: Element): void {
  const list = tag(flow.doc, parent, 'L');
  const width = PAGE.main - TERM;
  for (const [what, value] of facts) {
    const spans = [{ text: cleanText(value), style: STYLES.body }];
    const height = breakLines(spans, width, flow.pen).length * STYLES.body.leading;
    flow.need(Math.min(height, 4 * STYLES.body.leading) + 2 * PAD);
    rule(flow.doc, PAGE.left, flow.y, PAGE.main);
    flow.y += PAD;
    const entry = tag(flow.doc, list, 'LI');
    mark(flow.doc, tag(flow.doc, entry, 'Lbl'), 'Lbl', () => {
      flow.pen.place(what, PAGE.left, flow.y + baseline(STYLES.faint), STYLES.faint);
    });
    setLines(flow, tag(flow.doc, entry, 'LBody'), 'LBody', spans, PAGE.left + TERM, width);
    flow.y += PAD;
  }
  doubleRule(flow.doc, PAGE.left, flow.y, PAGE.main);
  flow.y += 4;
}
