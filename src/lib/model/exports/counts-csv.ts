import type { CountData } from '$lib/stats/types';
import { csvCell } from './csv-cell';

/** Counts as a table that every program reads, and this one reads back to the same counts. Lines end in CR LF. */
export const countsCsv = (data: CountData): string => `${rowsOf(data).join('\r\n')}\r\n`;

function rowsOf(data: CountData): string[] {
  if (data.kind === 'histogram')
    return [
      'count,shots',
      ...(data.below ? [`0-${data.below.to},${data.below.shots}`] : []),
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
