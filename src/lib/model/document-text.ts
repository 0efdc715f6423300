import type { Diagnosis } from '$lib/stats/types';

/**
 * The diagnosis document as the text of a file: JSON indented by two spaces, keys in the order of
 * the type, one line end at the close. Page, command line and API write it with this function, so
 * the same input, options, seed and engine version give the same bytes everywhere.
 */
export function documentText(diagnosis: Diagnosis): string {
  return `${JSON.stringify(diagnosis, null, 2)}\n`;
}
