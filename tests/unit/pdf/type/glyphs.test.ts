import type { FontName } from '$lib/pdf/type/fonts';
import { stretchesOf, type HasGlyph } from '$lib/pdf/type/glyphs';
import { describe, expect, it } from 'vitest';

const LETTERS: Partial<Record<FontName, RegExp>> = {
  text: /[a-z +²]/,
  symbols: /[κ≤²⁻é\u0301⟨⟩a]/,
  any: /漢/
};
const has: HasGlyph = (font, point) => LETTERS[font]?.test(String.fromCodePoint(point)) ?? false;

describe('stretchesOf', () => {
  it('takes the face asked for, then the symbols, then the last resort', () => {
    expect(stretchesOf('a κ≤ 漢', 'text', has)).toEqual([
      { font: 'text', text: 'a ' },
      { font: 'symbols', text: 'κ≤' },
      { font: 'text', text: ' ' },
      { font: 'any', text: '漢' }
    ]);
  });

  it('takes raised digits from one font, and keeps a letter and its mark together', () => {
    expect(stretchesOf('b²⁻', 'text', has)).toEqual([
      { font: 'text', text: 'b' },
      { font: 'symbols', text: '²⁻' }
    ]);
    expect(stretchesOf('ba\u0301', 'text', has)[1]).toEqual({ font: 'symbols', text: 'a\u0301' });
  });

  it('spells out what no font has', () => {
    const text = stretchesOf('b\u{1fae8}', 'text', has)
      .map((stretch) => stretch.text)
      .join('');
    expect(text).toBe('b⟨U+1FAE8⟩');
  });
});
