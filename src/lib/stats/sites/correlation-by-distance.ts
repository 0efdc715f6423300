import { countTogether } from './count-together';
import { siteColumns } from './site-columns';

/** Mean correlation of all pairs of one distance; without ends where shots are too few to tell an error. */
export interface DistanceCorrelation {
  distance: number;
  /** Pairs whose sites both vary. */
  pairs: number;
  value: number | null;
  low: number | null;
  high: number | null;
}

/** Student's t at 97.5 % for 1 to 19 degrees of freedom (published tables; R 4.2: qt(0.975, 1:19)). */
const reach = [
  12.7062, 4.3027, 3.1824, 2.7764, 2.5706, 2.4469, 2.3646, 2.306, 2.2622, 2.2281, 2.201, 2.1788, 2.1604,
  2.1448, 2.1314, 2.1199, 2.1098, 2.1009, 2.093
];

/**
 * Mean correlation by distance with 95 % intervals from a jackknife over up to 20 blocks of consecutive shots, each a
 * whole number of 32 shots but the last: drift that is slower than a block widens them, as it should.
 *
 * @param shots packed rows as in siteColumns
 *
 * Source: Efron & Tibshirani 1993, An Introduction to the Bootstrap, chapter 11.
 */
export function correlationByDistance(
  shots: Uint8Array[],
  sites: number,
  geometry: 'chain' | 'ring'
): DistanceCorrelation[] {
  const columns = siteColumns(shots, sites);
  const words = Math.ceil(shots.length / 32);
  const blocks = Math.min(20, words);
  const ends = Array.from({ length: blocks }, (_, g) => Math.floor(((g + 1) * words) / blocks));
  const parts = columns.map((column) =>
    ends.map((end, g) => column.subarray(g === 0 ? 0 : ends[g - 1], end))
  );
  const sums = parts.map((part) => part.map((piece) => countTogether(piece, piece)));
  const totals = sums.map((each) => each.reduce((sum, one) => sum + one, 0));
  const sizes = ends.map((end, g) => Math.min(shots.length, 32 * end) - (g === 0 ? 0 : 32 * ends[g - 1]));
  const furthest = geometry === 'ring' ? Math.floor(sites / 2) : sites - 1;
  // One row a distance: number of pairs, sum with all shots, and sums with each block left out.
  const rows = Array.from({ length: furthest }, () => new Float64Array(blocks + 2));
  for (let first = 0; first < sites; first++) {
    for (let second = first + 1; second < sites; second++) {
      const both = ends.map((_, g) => countTogether(parts[first][g], parts[second][g]));
      const all = both.reduce((sum, one) => sum + one, 0);
      const whole = phi(all, totals[first], totals[second], shots.length);
      if (whole === null) continue;
      const apart = second - first;
      const row = rows[(geometry === 'ring' ? Math.min(apart, sites - apart) : apart) - 1];
      row[0] += 1;
      row[1] += whole;
      for (let g = 0; g < blocks; g++) {
        const [a, b] = [totals[first] - sums[first][g], totals[second] - sums[second][g]];
        // Where the rest of the shots never show one of the sites, nothing of its correlation is left.
        row[2 + g] += phi(all - both[g], a, b, shots.length - sizes[g]) ?? 0;
      }
    }
  }
  return rows.map((row, i) => ({ distance: i + 1, pairs: row[0], ...meanOf(row, blocks) }));
}

function meanOf(
  row: Float64Array,
  blocks: number
): { value: number | null; low: number | null; high: number | null } {
  if (row[0] === 0) return { value: null, low: null, high: null };
  const value = row[1] / row[0];
  if (blocks < 2) return { value, low: null, high: null };
  const without = Array.from(row.subarray(2), (sum) => sum / row[0]);
  const mean = without.reduce((sum, one) => sum + one, 0) / blocks;
  const squares = without.reduce((sum, one) => sum + (one - mean) ** 2, 0);
  const error = Math.sqrt(((blocks - 1) / blocks) * squares) * reach[blocks - 2];
  return { value, low: value - error, high: value + error };
}

function phi(both: number, first: number, second: number, shots: number): number | null {
  const spread = Math.sqrt(first * (shots - first)) * Math.sqrt(second * (shots - second));
  return spread > 0 ? (both * shots - first * second) / spread : null;
}
