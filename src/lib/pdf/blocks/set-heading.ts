import { pointPath } from '$lib/charts/point-path';
import type { Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { adorn, tag, type Element } from '../page/tags';
import type { Span } from '../type/break-lines';
import { cleanText } from '../type/clean-text';
import { STYLES } from '../type/styles';
import type { Block } from './blocks';
import { drawMarks } from './draw-marks';
import { setLines } from './set-lines';

/** A heading of the third rank; `sign` puts the charts' mark for more or fewer before it. */
export function setHeading(flow: Flow, block: Block & { kind: 'heading' }, parent: Element): void {
  const { sign } = block;
  const style = sign
    ? { ...STYLES.heading, ink: sign === 'more' ? ('oxide' as const) : ('verdigris' as const) }
    : STYLES.heading;
  let x: number = PAGE.left;
  if (sign) {
    const shape = sign === 'more' ? 'up' : 'down';
    adorn(flow.doc, () =>
      drawMarks(
        flow.pen,
        [{ kind: 'path', role: `observed-${sign}`, d: pointPath([[5, 7]], shape, 9) }],
        x,
        flow.y
      )
    );
    x += 14;
  }
  const spans: Span[] = [{ text: cleanText(block.text), style }];
  if (block.after) spans.push({ text: ` ${block.after}`, style: { ...style, face: 'text' } });
  setLines(flow, tag(flow.doc, parent, 'H3'), 'H3', spans, x, PAGE.main - (x - PAGE.left));
}
