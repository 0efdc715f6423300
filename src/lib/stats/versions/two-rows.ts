import type { Histogram } from '../types';

/** Two histograms as the rows of a table: `first[i]` and `second[i]` shots had the i-th count. */
export interface TwoRows {
  first: Float64Array;
  second: Float64Array;
  /** Shots of each row. */
  totals: [number, number];
}

/**
 * Lines two histograms up as a table of 2 × K cells, K the number of counts seen in either. Rows that lump counts are
 * lumped in both alike, as far as the wider of the two reaches: what one of them does not tell apart cannot be compared.
 *
 * @param a, b histograms with at least one shot each, as toHistogram leaves them
 */
export function twoRows(a: Histogram, b: Histogram): TwoRows {
  const from = Math.min(a.lump?.from ?? Infinity, b.lump?.from ?? Infinity);
  const to = Math.max(a.below?.to ?? -Infinity, b.below?.to ?? -Infinity);
  const cells = new Map<number, [number, number]>();
  [a, b].forEach((histogram, row) => {
    const { counts, lump, below } = histogram;
    const seen: [number, number][] = [...counts];
    if (lump) seen.push([lump.from, lump.shots]);
    if (below) seen.push([below.to, below.shots]);
    for (const [count, shots] of seen) {
      if (shots === 0) continue;
      const key = Math.min(from, Math.max(to, count));
      const cell = cells.get(key) ?? [0, 0];
      cell[row] += shots;
      cells.set(key, cell);
    }
  });
  const columns = [...cells].sort((x, y) => x[0] - y[0]).map(([, cell]) => cell);
  const first = Float64Array.from(columns, ([x]) => x);
  const second = Float64Array.from(columns, ([, y]) => y);
  const sum = (row: Float64Array) => row.reduce((total, h) => total + h, 0);
  return { first, second, totals: [sum(first), sum(second)] };
}
