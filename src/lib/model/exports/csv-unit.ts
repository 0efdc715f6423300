import type { Unit } from '$lib/stats/types';

/** What the counts of a table are, for its first column: after `data` a document counts in the unit that was tested. */
export const csvUnit = (unit: Unit): string => (unit === 'pair' ? 'pairs' : 'defects');
