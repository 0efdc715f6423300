import type { Handle } from '@sveltejs/kit';

/** Faces of running text and figures: without them on the first paint a page would stay with the fallback (fonts.css). */
const FIRST = /latin-(400|700)-normal[^/]*\.woff2$/;

/** Names those fonts in the head of each page, beside Kit's own scripts and styles. */
export const preloadFonts: Handle = ({ event, resolve }) =>
  resolve(event, {
    preload: ({ type, path }) => type === 'js' || type === 'css' || (type === 'font' && FIRST.test(path))
  });
