/** Glyphs of a text with their places, in thousandths of the size. */
export interface GlyphRun {
  glyphs: { id: number }[];
  positions: Position[];
  advanceWidth: number;
}

interface Position {
  xAdvance: number;
  yAdvance: number;
  xOffset: number;
  yOffset: number;
  advanceWidth: number;
}

/** What pdfkit keeps from its types: a font's layout of one word, with the space after it. */
export interface LaysWords {
  layoutCached(text: string): GlyphRun;
  layoutRun(text: string, features: Record<string, boolean>): GlyphRun;
}

const PLAIN = /^[!-~]+ ?$/;

/** What joins signs with marks has nothing to do in ASCII, and is half of the work. */
const NO_MARKS = { ccmp: false, mark: false, mkmk: false };

/**
 * Has a font lay out plain words as a chain of pairs: nothing but kerning acts between two signs of ASCII in the faces of
 * text, so that a sign's advance is known once it has been seen before the next one. The font's own layout of every word,
 * once with a space after it and once without, took a third of a first PDF. Words with any other sign are left to the font.
 *
 * The places are the same as the font's own (`layout-by-pairs.test.ts` compares them).
 *
 * @param kerns false for a face of one width, in which every sign stands alone
 */
export function layoutByPairs(font: LaysWords, kerns: boolean): void {
  const whole = font.layoutCached.bind(font);
  const known = new Map<string, GlyphRun>();
  const words = new Map<string, GlyphRun>();
  const runOf = (text: string): GlyphRun => {
    let run = known.get(text);
    if (!run) known.set(text, (run = font.layoutRun(text, NO_MARKS)));
    return run;
  };
  font.layoutCached = (text) => {
    if (!PLAIN.test(text)) return whole(text);
    let run = words.get(text);
    if (run) return run;
    run = { glyphs: [], positions: [], advanceWidth: 0 };
    for (let i = 0; i < text.length; i++) {
      const next = text[i + 1];
      // Before a space, and at the end, a sign stands as it does alone.
      const { glyphs, positions } = runOf(
        kerns && next !== undefined && next !== ' ' ? text[i] + next : text[i]
      );
      run.glyphs.push(glyphs[0]);
      run.positions.push(positions[0]);
      run.advanceWidth += positions[0].xAdvance;
    }
    words.set(text, run);
    return run;
  };
}
