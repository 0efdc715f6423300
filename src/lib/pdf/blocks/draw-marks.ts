import { inkOfRole } from '$lib/charts/ink-of-role';
import type { Mark, TextMark } from '$lib/charts/picture';
import type { Pen } from '../type/pen';
import { colourOf, type Style } from '../type/styles';
import { straighten } from './straighten';

/** Draws the marks of a chart as vectors, its corner at `x`, `y`, `scale` points for each of its units. */
export function drawMarks(pen: Pen, marks: Mark[], x: number, y: number, scale = 1): void {
  const { doc } = pen;
  doc.save();
  doc.translate(x, y).scale(scale);
  for (const mark of marks) {
    if (mark.kind === 'text') drawText(pen, mark);
    else if (mark.d !== '') drawPath(doc, mark.d, inkOfRole(mark.role));
  }
  doc.restore();
}

function drawPath(doc: PDFKit.PDFDocument, d: string, look: ReturnType<typeof inkOfRole>): void {
  doc.path(straighten(d));
  if (look.stroke === 'none') {
    doc.fill(colourOf(look.fill));
    return;
  }
  doc.lineWidth(look.width);
  if (look.dash.length > 0) doc.dash(look.dash[0], { space: look.dash[1] });
  else doc.undash();
  if (look.fill === 'none') doc.stroke(colourOf(look.stroke));
  else doc.fillAndStroke(colourOf(look.fill), colourOf(look.stroke));
}

function drawText(pen: Pen, mark: TextMark): void {
  const style: Style = { face: mark.face, size: mark.size, leading: mark.size, ink: mark.ink };
  const raised: Style = { ...style, size: mark.size * 0.75, rise: mark.size * 0.4 };
  const main = pen.width(mark.text, style);
  const full = main + (mark.raised === undefined ? 0 : pen.width(mark.raised, raised));
  const left = mark.x - (mark.anchor === 'end' ? full : mark.anchor === 'middle' ? full / 2 : 0);
  if (mark.halo)
    pen.doc.rect(left - 3, mark.y - mark.size * 0.82, full + 6, mark.size * 1.05).fill(colourOf('paper'));
  pen.place(mark.text, left, mark.y, style);
  if (mark.raised !== undefined) pen.place(mark.raised, left + main, mark.y, raised);
}
