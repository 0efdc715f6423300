import type { Summary } from './summary';

/** The text of a summary as a file, the same wherever it is given out. */
export const summaryText = (summary: Summary): string => `${JSON.stringify(summary, null, 2)}\n`;
