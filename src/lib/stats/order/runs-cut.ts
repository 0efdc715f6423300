/**
 * The count that parts the shots into two halves as even as can be: "above" is a count > cut. Without ties this is
 * the median. With ties, of which counts have plenty, the tied shots go together to the side that leaves the halves
 * most even (the lower side if both do), since dropping them, the other practice, can leave one side empty: with
 * 60 % empty shots the median is 0 and nothing lies below.
 *
 * It depends on the counts alone, not on their order, so permutations share it.
 *
 * @returns null when all shots have the same count
 */
export function runsCut(shots: ArrayLike<number>): number | null {
  const sorted = Float64Array.from(shots).sort();
  const { length } = sorted;
  let best: number | null = null;
  let bestGap = Infinity;
  for (let below = 1; below < length; below++) {
    if (sorted[below] === sorted[below - 1]) continue;
    const gap = Math.abs(length - 2 * below);
    // On equal gaps the later cut wins: the tied shots are then below.
    if (gap <= bestGap) {
      best = sorted[below - 1];
      bestGap = gap;
    }
  }
  return best;
}
