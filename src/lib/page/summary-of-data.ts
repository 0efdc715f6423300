import type { CountData } from '$lib/stats/types';

export interface DataSummary {
  shots: number;
  /** Distinct counts that were seen. */
  distinct: number;
  smallest: number;
  largest: number;
  /** True when the largest is a closing row such as "10+". */
  open: boolean;
  /** True when the smallest ends an opening row such as "0-2". */
  opening: boolean;
  batches: number | null;
}

/** What a person checks at a glance after a file was read. */
export function summaryOfData(data: CountData): DataSummary {
  if (data.kind === 'shots') {
    let smallest = Infinity;
    let largest = -Infinity;
    for (const count of data.shots) {
      if (count < smallest) smallest = count;
      if (count > largest) largest = count;
    }
    const batches = data.batches ? new Set(data.batches).size : null;
    return {
      shots: data.shots.length,
      distinct: new Set(data.shots).size,
      smallest,
      largest,
      open: false,
      opening: false,
      batches
    };
  }
  const seen = data.counts.filter(([, shots]) => shots > 0);
  const { lump, below = null } = data;
  const shots = seen.reduce((sum, row) => sum + row[1], (lump?.shots ?? 0) + (below?.shots ?? 0));
  return {
    shots,
    distinct: seen.length + (lump ? 1 : 0) + (below ? 1 : 0),
    smallest: below?.to ?? seen[0]?.[0] ?? lump?.from ?? 0,
    largest: lump?.from ?? seen[seen.length - 1]?.[0] ?? below?.to ?? 0,
    open: lump !== null,
    opening: below !== null,
    batches: null
  };
}
