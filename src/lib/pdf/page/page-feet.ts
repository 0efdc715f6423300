import type { Pen } from '../type/pen';
import { STYLES } from '../type/styles';
import { PAGE } from './geometry';

/** Source and "n of m" at the foot of every page, once all pages are there. */
export function pageFeet(pen: Pen, source: string): void {
  const { doc } = pen;
  const { start, count } = doc.bufferedPageRange();
  for (let i = 0; i < count; i++) {
    doc.switchToPage(start + i);
    doc.markContent('Artifact', { type: 'Pagination' });
    pen.place(source, PAGE.left, PAGE.foot, STYLES.foot);
    const number = `${i + 1} of ${count}`;
    pen.place(number, PAGE.left + PAGE.whole - pen.width(number, STYLES.foot), PAGE.foot, STYLES.foot);
    doc.endMarkedContent();
  }
}
