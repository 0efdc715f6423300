import { countsCsv as table } from '$lib/model/exports/counts-csv';
import type { Conditions } from '$lib/model/team/datasets/conditions';
import type { CountData } from '$lib/stats/types';

/** Counts as a table that this program reads back to the same counts, under the conditions as lines of remarks. */
export function countsCsv(conditions: Conditions, data: CountData): string {
  const stated = Object.entries(conditions)
    .filter(([, value]) => value !== null)
    .map(([name, value]) => `# ${name}: ${String(value).replace(/\s+/g, ' ')}\r\n`);
  return stated.join('') + table(data);
}
