import type { HasGlyph } from './glyphs';
import { stretchesOf } from './glyphs';
import type { FontName } from './fonts';
import { layoutByPairs, type LaysWords } from './layout-by-pairs';
import { colourOf, type Style } from './styles';
import { visualOrder } from './visual-order';

/** What pdfkit keeps from its types: the font in hand and its character map. */
interface FontInHand {
  _font: LaysWords & { font: { hasGlyphForCodePoint(codePoint: number): boolean } };
}

const FACES: FontName[] = ['text', 'bold', 'italic', 'number'];

/** Sets text with pdfkit: finds a font for every sign, measures, and places on a line. */
export class Pen {
  private readonly known = new Map<string, boolean>();
  private readonly widths = new Map<string, number>();

  private readonly fonts = new Set<FontName>();

  constructor(readonly doc: PDFKit.PDFDocument) {}

  /** Makes a font known. */
  addFont(name: FontName, file: Uint8Array): void {
    this.doc.registerFont(name, file);
    if (FACES.includes(name))
      layoutByPairs((this.doc.font(name) as unknown as FontInHand)._font, name !== 'number');
    this.fonts.add(name);
  }

  readonly has: HasGlyph = (font, codePoint) => {
    if (!this.fonts.has(font)) return false;
    const key = `${font} ${codePoint}`;
    let found = this.known.get(key);
    if (found === undefined) {
      this.doc.font(font);
      found = (this.doc as unknown as FontInHand)._font.font.hasGlyphForCodePoint(codePoint);
      this.known.set(key, found);
    }
    return found;
  };

  /** Width of a text on one line, points. */
  width(text: string, style: Style): number {
    const key = `${style.face} ${style.size} ${text}`;
    let width = this.widths.get(key);
    if (width === undefined) {
      width = 0;
      for (const { font, text: part } of stretchesOf(text, style.face, this.has))
        width += this.doc.font(font).fontSize(style.size).widthOfString(part);
      this.widths.set(key, width);
    }
    return width;
  }

  /** Sets a text with its baseline at `y`, starting at `x`; returns where it ends. */
  place(text: string, x: number, y: number, style: Style, fromRight = false): number {
    let at = x;
    this.doc.fillColor(colourOf(style.ink));
    for (const piece of visualOrder(text, fromRight)) {
      for (const { font, text: part } of stretchesOf(piece, style.face, this.has)) {
        this.doc.font(font).fontSize(style.size);
        const width = this.doc.widthOfString(part);
        this.doc.text(part, at, y - (style.rise ?? 0), {
          lineBreak: false,
          baseline: 'alphabetic',
          textWidth: width,
          wordCount: 1
        } as PDFKit.Mixins.TextOptions);
        at += width;
      }
    }
    return at;
  }
}
