import { inflateSync } from 'node:zlib';
import { fontSource, type FontName } from '$lib/pdf/type/fonts';

/** The files as the bundler wrote them into the code, so that no path has to exist in production. */
const FILES: Record<FontName, () => Promise<{ default: string }>> = {
  text: () =>
    import('@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-latin-400-normal.woff?inline'),
  bold: () =>
    import('@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-latin-700-normal.woff?inline'),
  italic: () =>
    import('@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-latin-400-italic.woff?inline'),
  number: () =>
    import('@fontsource/atkinson-hyperlegible-mono/files/atkinson-hyperlegible-mono-latin-400-normal.woff?inline'),
  symbols: () => import('@fontsource/dejavu-sans/files/dejavu-sans-latin-400-normal.woff?inline'),
  any: () => import('@fontsource/unifontex/files/unifontex-latin-400-normal.woff?inline')
};

/** Fonts for server and command line; Node's own zlib unpacks them in a sixth of the time. */
export const serverFonts = fontSource(
  async (name) => {
    const { default: inlined } = await FILES[name]();
    return Buffer.from(inlined.slice(inlined.indexOf(',') + 1), 'base64');
  },
  (packed) => inflateSync(packed)
);
