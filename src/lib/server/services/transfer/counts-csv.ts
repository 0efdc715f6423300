import type { Conditions } from '$lib/model/team/datasets/conditions';
import type { CountData } from '$lib/stats/types';
import { csvCell } from '../datasets/csv-cell';

/** Counts as a table that this program reads back to the same counts, under the conditions as lines of remarks. */
export function countsCsv(conditions: Conditions, data: CountData): string {
  const stated = Object.entries(conditions)
    .filter(([, value]) => value !== null)
    .map(([name, value]) => `# ${name}: ${String(value).replace(/\s+/g, ' ')}`);
  return [...stated, ...rows(data)].join('\r\n') + '\r\n';
}

function rows(data: CountData): string[] {
  if (data.kind === 'histogram')
    return [
      'count,shots',
      ...data.counts.map(([count, shots]) => `${count},${shots}`),
      ...(data.lump ? [`${data.lump.from}+,${data.lump.shots}`] : [])
    ];
  const { batches } = data;
  if (!batches) return ['count', ...Array.from(data.shots, String)];
  return [
    'shot,batch,count',
    ...Array.from(data.shots, (count, i) => `${i + 1},${csvCell(batches[i])},${count}`)
  ];
}
