import { breakLines, type Line, type Span } from '../type/break-lines';
import type { Pen } from '../type/pen';
import { readsFromRight } from '../type/visual-order';
import { mark, type Element } from '../page/tags';
import type { Flow } from '../page/flow';

/** Baseline of a line, below its top. */
export const baseline = ({ leading, size }: Span['style']): number => (leading - size) / 2 + size * 0.8;

/** Places one broken line with its top at `y`. */
export function placeLine(line: Line, x: number, y: number, width: number, pen: Pen): void {
  const fromRight = line.pieces.length === 1 && readsFromRight(line.pieces[0].text);
  const left = fromRight ? x + width - line.width : x;
  for (const piece of line.pieces)
    pen.place(piece.text, left + piece.x, y + baseline(piece.style), piece.style, fromRight);
}

/**
 * Sets a paragraph in the main column as content of `element`, over pages where it must: neither its first nor its
 * last line is left alone on a page.
 */
export function setLines(
  flow: Flow,
  element: Element,
  type: string,
  spans: Span[],
  x: number,
  width: number
): void {
  const lines = breakLines(spans, width, flow.pen);
  const { leading } = spans[0].style;
  let from = 0;
  while (from < lines.length) {
    let to = Math.min(lines.length, from + Math.max(1, Math.floor((flow.room + 0.01) / leading)));
    if (to === lines.length - 1 && to - from > 2) to--;
    const part = lines.slice(from, to);
    mark(flow.doc, element, type, () =>
      part.forEach((line, i) => placeLine(line, x, flow.y + i * leading, width, flow.pen))
    );
    flow.y += part.length * leading;
    from = to;
    if (from < lines.length) flow.newPage();
  }
}
