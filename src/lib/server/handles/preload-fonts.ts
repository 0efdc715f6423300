import type { Handle } from '@sveltejs/kit';

/**
 * Faces of running text, figures and the words beside our name: without the first on the first paint a page would stay
 * with the fallback (fonts.css), and the last, when it comes late, has the page laid out once more.
 */
const FIRST = /latin-((400|700)-normal|400-italic)[^/]*\.woff2$/;

/** Names those fonts in the head of each page, beside Kit's own scripts and styles. */
export const preloadFonts: Handle = ({ event, resolve }) =>
  resolve(event, {
    preload: ({ type, path }) => type === 'js' || type === 'css' || (type === 'font' && FIRST.test(path))
  });
