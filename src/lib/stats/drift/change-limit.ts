/**
 * Chance that steady shots support a change as well, for long lists: the largest standardised difference of two means
 * over all cuts k with h ≤ k/S ≤ 1 − h passes x = √score with probability about
 * x·φ(x)·[(1 − 1/x²)·ln((1 − h)²/h²) + 4/x²].
 *
 * @param score largest (mean_before − mean_after)²·k(S − k)/S over the variance
 * @param least h
 * @returns 1 where the formula, which is for small chances, gives more
 * Source: James, James & Siegmund 1987, Biometrika 74:71 (m); held against permutations by the tests.
 */
export function changeLimit(score: number, least: number): number {
  if (!(score > 1)) return 1;
  const density = Math.exp(-score / 2) / Math.sqrt(2 * Math.PI);
  const odds = 2 * Math.log((1 - least) / least);
  return Math.min(1, Math.sqrt(score) * density * ((1 - 1 / score) * odds + 4 / score));
}
