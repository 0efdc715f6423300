import type { Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { mark, tag, type Element } from '../page/tags';
import { breakLines } from '../type/break-lines';
import { STYLES } from '../type/styles';
import { placeLine } from './set-lines';

/** An address that can be followed. Anything but http and https is set as plain text. */
export function setLink(flow: Flow, address: string, parent: Element): void {
  const { doc, pen } = flow;
  const style = STYLES.body;
  const lines = breakLines([{ text: address, style }], PAGE.main, pen);
  flow.need(lines.length * style.leading);
  const safe = /^https?:\/\//.test(address);
  const link = tag(doc, tag(doc, parent, 'P'), safe ? 'Link' : 'Span', { alt: `Open ${address}` });
  mark(doc, link, safe ? 'Link' : 'Span', () =>
    lines.forEach((line, i) => placeLine(line, PAGE.left, flow.y + i * style.leading, PAGE.main, pen))
  );
  if (safe) {
    lines.forEach((line, i) => {
      doc.link(PAGE.left, flow.y + i * style.leading, line.width, style.leading, address, {
        structParent: link,
        Contents: new String(`Open ${address}`)
      } as unknown as PDFKit.Mixins.AnnotationOption);
    });
    // Ended while its page is in hand: the annotation is written down with that page.
    link.end();
  }
  flow.y += lines.length * style.leading;
}
