import type { Diagnosis } from '$lib/stats/types';

/** The diagnosis document as the text of a file. */
export const documentText = (diagnosis: Diagnosis): string => `${JSON.stringify(diagnosis, null, 2)}\n`;
