/** Marks of Svelte in what a server draws, by which a browser finds again what it makes live. */
const MARKS = /<!--(?:\[-?\d*|\])?-->/g;

/** In escaped markup no text begins so: `<` is written out everywhere. */
const KEPT = '<!~';

/** Whoever draws within a page that stands as it is finds this in its context. */
export const STANDS = Symbol('stands as drawn');

/** Markup of a part that a browser will make live: its marks are safe from `plainMarkup`. */
export const liveMarkup = (drawn: string): string => drawn.replaceAll('<!--', KEPT);

/**
 * Markup of a page that nobody makes live but for parts given to `liveMarkup`: without marks. A report had 3400 of
 * them, twice as many as elements, and a browser makes a node of each.
 */
export const plainMarkup = (drawn: string): string => drawn.replace(MARKS, '').replaceAll(KEPT, '<!--');
