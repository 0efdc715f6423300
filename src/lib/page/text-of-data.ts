import type { CountData } from '$lib/stats/types';

/** The counts as text for the field, in a form that the reader understands without a guess that matters. */
export function textOfData(data: CountData): string {
  if (data.kind === 'histogram') {
    const rows = data.counts.map(([count, shots]) => `${count},${shots}`);
    if (data.below) rows.unshift(`0-${data.below.to},${data.below.shots}`);
    if (data.lump) rows.push(`${data.lump.from}+,${data.lump.shots}`);
    return ['count,frequency', ...rows].join('\n');
  }
  const { shots, batches } = data;
  if (!batches) return ['count', ...Array.from(shots, String)].join('\n');
  const quoted = (name: string) => (/[",\n#]/.test(name) ? `"${name.replaceAll('"', '""')}"` : name);
  return ['shot,batch,count', ...Array.from(shots, (n, i) => `${i + 1},${quoted(batches[i])},${n}`)].join(
    '\n'
  );
}
