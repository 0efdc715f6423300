/**
 * Seconds that a run still needs, by the share done so far.
 * @returns null in the first second and before 3 % are done: a guess would only jump about
 */
export function timeLeft(elapsed: number, share: number): number | null {
  if (elapsed < 1 || share < 0.03 || share > 1) return null;
  return (elapsed * (1 - share)) / share;
}
