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

const height = (value: string, flow: Flow): number =>
  breakLines([{ text: cleanText(value), style: STYLES.body }], PAGE.main - TERM, flow.pen).length *
  STYLES.body.leading;

/** Points that a whole list of facts takes. */
export const factsHeight = (flow: Flow, facts: [string, string][]): number =>
  facts.reduce((sum, [, value]) => sum + height(value, flow) + 2 * PAD, 4);

/** A short list of what is what, with a rule above each line and a double one at the end. */
export function setFacts(flow: Flow, facts: [string, string][], parent: Element): void {
  const list = tag(flow.doc, parent, 'L');
  const width = PAGE.main - TERM;
  for (const [what, value] of facts) {
    const spans = [{ text: cleanText(value), style: STYLES.body }];
    flow.need(Math.min(height(value, flow), 4 * STYLES.body.leading) + 2 * PAD);
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
