import type { Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { mark, tag, type Element } from '../page/tags';
import { formulaSpans } from '../type/formula-spans';
import { STYLES } from '../type/styles';
import type { Formula } from './blocks';
import { baseline, setLines } from './set-lines';
import { spansOf } from './set-paragraph';

const TERM = 96;

/** Formulas, one under another: name, formula, and in words what it is for. */
export function setFormulas(flow: Flow, formulas: Formula[], parent: Element): void {
  const { pen, doc } = flow;
  for (const { name, formula, alt, words } of formulas) {
    flow.need(STYLES.formula.leading + 2 * STYLES.body.leading);
    const line = flow.y + baseline(STYLES.formula);
    const group = tag(doc, parent, 'Div');
    mark(doc, tag(doc, group, 'P'), 'P', () => pen.place(name, PAGE.left, line, STYLES.strong));
    mark(doc, tag(doc, group, 'Formula', { alt }), 'Formula', () => {
      let x = PAGE.left + TERM;
      for (const { text, style } of formulaSpans(formula, STYLES.formula))
        x = pen.place(text, x, line, style);
    });
    flow.y += STYLES.formula.leading;
    setLines(
      flow,
      tag(doc, group, 'P'),
      'P',
      spansOf(words, STYLES.body),
      PAGE.left + TERM,
      PAGE.main - TERM
    );
    flow.y += 6;
  }
}
