import italic from '@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-latin-400-italic.woff?inline';
import text from '@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-latin-400-normal.woff?inline';
import bold from '@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-latin-700-normal.woff?inline';
import number from '@fontsource/atkinson-hyperlegible-mono/files/atkinson-hyperlegible-mono-latin-400-normal.woff?inline';
import symbols from '@fontsource/dejavu-sans/files/dejavu-sans-latin-400-normal.woff?inline';
import { woffToSfnt } from './woff-to-sfnt';

/** The faces that text is set in. */
export type Face = 'text' | 'bold' | 'italic' | 'number';

/**
 * The font files. `symbols` (DejaVu Sans) has the Greek, ≤ √ ∞ and raised digits that the latin subsets lack, and
 * further alphabets; `any` (UnifontEX) has a plain form of nearly every sign there is.
 */
export type FontName = Face | 'symbols' | 'any';

/** Bytes of a font that the bundler wrote into the code, so that no path has to exist in production. */
const bytes = (inlined: string): Buffer =>
  woffToSfnt(Buffer.from(inlined.slice(inlined.indexOf(',') + 1), 'base64'));

type Always = Exclude<FontName, 'any'>;
let always: Record<Always, Buffer> | null = null;
let last: Buffer | null = null;

/** The fonts that every report needs. Unpacked once. */
export function fonts(): Record<Always, Buffer> {
  always ??= {
    text: bytes(text),
    bold: bytes(bold),
    italic: bytes(italic),
    number: bytes(number),
    symbols: bytes(symbols)
  };
  return always;
}

/** 3 MB, and few reports need it: read only when a name has signs that no other font has. */
export async function anyFont(): Promise<Buffer> {
  last ??= bytes(
    (await import('@fontsource/unifontex/files/unifontex-latin-400-normal.woff?inline')).default
  );
  return last;
}
