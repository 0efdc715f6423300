/**
 * Histogram of counts, ascending.
 *
 * @param shots one count a shot, integers ≥ 0
 * @returns `[count, shots]` for every count that occurred
 */
export function tally(shots: Iterable<number>): [number, number][] {
  const seen = new Map<number, number>();
  for (const count of shots) seen.set(count, (seen.get(count) ?? 0) + 1);
  return [...seen].sort((a, b) => a[0] - b[0]);
}
