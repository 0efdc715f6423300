/**
 * Multiplications that one law of a story may cost. A fit takes about 300 laws and its resamples some thousand more:
 * this many of them are a few seconds.
 */
const budget = 5e5;

/** Why a law that is built step by step is not, or null. */
export function withinBudget(multiplications: number): string | null {
  return multiplications <= budget ? null : 'With so many trials its law would take too long to compute.';
}
