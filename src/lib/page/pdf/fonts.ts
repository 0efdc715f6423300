import { fontSource, type FontName } from '$lib/pdf/type/fonts';
import italic from '@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-latin-400-italic.woff?url';
import text from '@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-latin-400-normal.woff?url';
import bold from '@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-latin-700-normal.woff?url';
import number from '@fontsource/atkinson-hyperlegible-mono/files/atkinson-hyperlegible-mono-latin-400-normal.woff?url';
import symbols from '@fontsource/dejavu-sans/files/dejavu-sans-latin-400-normal.woff?url';
import any from '@fontsource/unifontex/files/unifontex-latin-400-normal.woff?url';

const ADDRESSES: Record<FontName, string> = { text, bold, italic, number, symbols, any };

/** Fonts for the browser: fetched from where the page came from, when a PDF is asked for. */
export const pageFonts = fontSource(async (name) => {
  const answer = await fetch(ADDRESSES[name]);
  if (!answer.ok) throw new Error(`The server does not give the font "${name}".`);
  return new Uint8Array(await answer.arrayBuffer());
});
