/**
 * Mean and variance of the number of runs over all orders of `above` and `below` shots:
 * 1 + 2ab/n and 2ab(2ab − n)/(n²(n − 1)), n = a + b.
 *
 * @param above, below whole numbers ≥ 1; the variance is 0 for one shot on each side
 *
 * Source: Wald & Wolfowitz 1940, Ann. Math. Statist. 11:147; Mood 1940, ibid. 11:367 (m).
 */
export function runsMoments(above: number, below: number): { mean: number; variance: number } {
  const length = above + below;
  const twice = 2 * above * below;
  return {
    mean: 1 + twice / length,
    variance: ((twice / length) * ((twice - length) / length)) / (length - 1)
  };
}
