import { layoutByPairs, type GlyphRun, type LaysWords } from '$lib/pdf/type/layout-by-pairs';
import type { FontName } from '$lib/pdf/type/fonts';
import { serverFonts } from '$lib/server/pdf/fonts';
import PDFDocument from 'pdfkit';
import { describe, expect, it } from 'vitest';
import { readFileSync } from 'node:fs';

/** Every word of a whole document, and pairs that kern, as the font's own layout is asked for them. */
const WORDS = [
  ...new Set(readFileSync('fixtures/guide/bunched-sites.json', 'utf8').split(/[^!-~]+/)),
  'AVAToWa.Ty,"Yo"',
  'fi',
  'ffl',
  '1/2',
  '!="#$%&\'()*+,-./:;<=>?@[]^_`{|}~'
].filter((word) => word !== '' && word.length < 60);

async function fontOf(name: FontName): Promise<LaysWords> {
  const doc = new PDFDocument({ autoFirstPage: false, font: '' });
  doc.registerFont(name, await serverFonts(name));
  return (doc.font(name) as unknown as { _font: LaysWords })._font;
}

const placed = ({ glyphs, positions }: GlyphRun): unknown =>
  glyphs.map(({ id }, i) => {
    const { xAdvance, xOffset, yOffset } = positions[i];
    return [id, +xAdvance.toFixed(9), xOffset, yOffset];
  });

describe('layoutByPairs', () => {
  it.each(['text', 'bold', 'italic', 'number'] as const)(
    'places the signs of %s as the font itself does, with and without a space after them',
    async (name) => {
      const [font, quick] = [await fontOf(name), await fontOf(name)];
      layoutByPairs(quick, name !== 'number');
      expect(WORDS.length).toBeGreaterThan(300);
      for (const word of [...WORDS, ...WORDS.map((w) => `${w} `)]) {
        const [own, ours] = [font.layoutCached(word), quick.layoutCached(word)];
        expect(placed(ours), word).toEqual(placed(own));
        expect(ours.advanceWidth).toBeCloseTo(own.advanceWidth, 6);
      }
    }
  );

  it('kerns: the faces of text set A and V closer than they stand alone', async () => {
    const font = await fontOf('text');
    layoutByPairs(font, true);
    const width = (text: string): number => font.layoutCached(text).advanceWidth;
    expect(width('AV')).toBeLessThan(width('A') + width('V'));
  });
});
