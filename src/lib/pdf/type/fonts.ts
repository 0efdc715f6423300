import { woffToSfnt, type Unpack } from './woff-to-sfnt';

/** The faces that text is set in. */
export type Face = 'text' | 'bold' | 'italic' | 'number';

/**
 * The fonts. `symbols` (DejaVu Sans) has the Greek, ≤ √ ∞ and raised digits that the latin subsets lack, and further
 * alphabets; `any` (UnifontEX) has a plain form of nearly every sign there is.
 */
export type FontName = Face | 'symbols' | 'any';

/** Those that every report needs. */
export const ALWAYS = ['text', 'bold', 'italic', 'number', 'symbols'] as const satisfies FontName[];

/**
 * Hands out TrueType files. Server and browser keep the same WOFF files in different places, so each has its own;
 * `any` is 3 MB, and few reports need it: it is asked for only when a name has signs that no other font has.
 */
export type FontSource = (name: FontName) => Promise<Uint8Array>;

/** A source that reads each WOFF file once and keeps what it unpacked. A file that could not be read is tried again. */
export function fontSource(read: (name: FontName) => Promise<Uint8Array>, unpack?: Unpack): FontSource {
  const kept = new Map<FontName, Promise<Uint8Array>>();
  return (name) => {
    const known = kept.get(name);
    if (known) return known;
    const font = read(name).then((woff) => woffToSfnt(woff, unpack));
    kept.set(name, font);
    font.catch(() => kept.delete(name));
    return font;
  };
}
