import type { Histogram, ShotList } from '$lib/stats/types';
import { readCounts } from '$lib/formats/read-counts';
import type { Dataset, ReadOptions, ReadResult } from '$lib/formats/types';

/** The datasets of a text that must be readable. */
export function datasets(input: string | Uint8Array, options: ReadOptions = {}): Dataset[] {
  const result = readCounts(input, options);
  if (!result.ok) throw new Error(listed(result).join('\n'));
  return result.datasets;
}

/** The only dataset's histogram. */
export function histogram(input: string | Uint8Array, options: ReadOptions = {}): Histogram {
  const [{ data }, ...more] = datasets(input, options);
  if (data.kind !== 'histogram' || more.length > 0) throw new Error('not one histogram');
  return data;
}

/** The only dataset's shot list, as plain numbers. */
export function shotList(
  input: string,
  options: ReadOptions = {}
): { shots: number[]; batches: string[] | null } {
  const [{ data }, ...more] = datasets(input, options);
  if (data.kind !== 'shots' || more.length > 0) throw new Error('not one shot list');
  return { shots: Array.from((data as ShotList).shots), batches: data.batches };
}

/** Problems as "line:column message". */
export function listed(result: ReadResult): string[] {
  return result.ok ? [] : result.problems.map(({ line, column, message }) => `${line}:${column} ${message}`);
}

/** Problems of a text as "line:column message"; empty when it was read. */
export function problems(input: string | Uint8Array, options: ReadOptions = {}): string[] {
  return listed(readCounts(input, options));
}
