import type { FontName } from './fonts';

/** Tells whether a font draws a sign. */
export type HasGlyph = (font: FontName, codePoint: number) => boolean;

/** A stretch of text that one font can draw. */
export interface Stretch {
  font: FontName;
  text: string;
}

// Raised digits come from one font: the latin subset has three of them, in another height. So do thin spaces: those
// of the number face are as wide as its digits.
const FROM_SYMBOLS = /[\u00b9\u00b2\u00b3\u2009\u202f\u2070-\u209f]/;

/**
 * Parts a text by the fonts that draw it: the face asked for, then the symbols, then the last resort. A letter and
 * the marks on it stay together. What none can draw is written out as ⟨U+1FAE8⟩.
 */
export function stretchesOf(text: string, face: FontName, has: HasGlyph): Stretch[] {
  if (/^[ -~]*$/.test(text)) return text === '' ? [] : [{ font: face, text }];
  const stretches: Stretch[] = [];
  const put = (font: FontName, part: string): void => {
    const last = stretches.at(-1);
    if (last?.font === font) last.text += part;
    else stretches.push({ font, text: part });
  };
  for (const [sign] of text.matchAll(/\P{M}\p{M}*|\p{M}+/gu)) {
    const points = [...sign].map((part) => part.codePointAt(0) ?? 0);
    const order: FontName[] = FROM_SYMBOLS.test(sign) ? ['symbols', 'any'] : [face, 'symbols', 'any'];
    const font = order.find((name) => points.every((point) => has(name, point)));
    if (font) put(font, sign);
    else for (const point of points) spell(point, put);
  }
  return stretches;
}

function spell(point: number, put: (font: FontName, part: string) => void): void {
  put('symbols', '⟨');
  put('text', `U+${point.toString(16).toUpperCase().padStart(4, '0')}`);
  put('symbols', '⟩');
}
