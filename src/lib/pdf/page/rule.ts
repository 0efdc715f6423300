import type { Ink } from '$lib/charts/picture';
import { colourOf } from '../type/styles';
import { adorn } from './tags';

/** A rule across, as an adornment. */
export function rule(
  doc: PDFKit.PDFDocument,
  x: number,
  y: number,
  width: number,
  ink: Ink = 'hair',
  weight = 0.5
): void {
  adorn(doc, () => {
    doc.lineWidth(weight).undash().strokeColor(colourOf(ink));
    doc
      .moveTo(x, y)
      .lineTo(x + width, y)
      .stroke();
  });
}

/** Two thin rules close together, as they close a column of figures. */
export function doubleRule(doc: PDFKit.PDFDocument, x: number, y: number, width: number): void {
  rule(doc, x, y, width, 'ink', 0.5);
  rule(doc, x, y + 1.8, width, 'ink', 0.5);
}
