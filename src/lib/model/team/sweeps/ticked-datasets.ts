import type { SweepFilter } from './sweep-filter';

interface Offered {
  id: string;
  device: string | null;
  firmware: string | null;
  group: string | null;
  unit: string;
  time: number | null;
}

/**
 * Which of the datasets offered for a sweep are ticked at first: those that were handed over, else the largest set
 * with a time above 0 that shares device, firmware version, group and unit; the first such set of several.
 */
export function tickedDatasets(rows: Offered[], { datasets }: Pick<SweepFilter, 'datasets'>): string[] {
  if (datasets.length > 0) return rows.map(({ id }) => id);
  const sets = new Map<string, string[]>();
  for (const { id, device, firmware, group, unit, time } of rows) {
    if (!((time ?? 0) > 0)) continue;
    const key = JSON.stringify([device, firmware, group, unit]);
    sets.set(key, [...(sets.get(key) ?? []), id]);
  }
  return [...sets.values()].reduce<string[]>((most, set) => (set.length > most.length ? set : most), []);
}
