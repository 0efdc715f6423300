import type { Handle } from '@sveltejs/kit';
import script from 'virtual:first-reading';

/** Where app.html keeps its place. */
const PLACE = '/* first-reading */';

/** Puts the script that reads out charts before anything else runs into pages that have such charts. */
export const firstReading: Handle = ({ event, resolve }) =>
  resolve(event, {
    transformPageChunk: ({ html }) =>
      html.replace(PLACE, () => (html.includes('data-readings=') ? script : ''))
  });
