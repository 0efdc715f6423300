/** Where Newton's inequalities are broken most, or come closest to it. */
export interface NewtonViolation {
  /** ln of f_{n−1} f_{n+1} (1 + 1/n)(1 + 1/(N−n)) / f_n²: positive where the inequality is broken. */
  excess: number;
  /** The count n. */
  count: number;
}

/**
 * Largest violation of Newton's inequalities, f_n² ≥ f_{n−1} f_{n+1} (1 + 1/n)(1 + 1/(N−n)), which the pmf of
 * every sum of independent trials obeys (all zeros of its generating function are real).
 *
 * @param pmf probabilities (or any multiple of them) of the counts 0, 1, 2, …; missing ones at the end are 0
 * @param trials N, or null when unknown or unbounded: then without the last factor
 * @returns the largest excess, in nats, and where. At most about 1e-15·n for a binomial pmf, which has equality
 *   throughout. Infinity at a zero between positive probabilities and at a positive one beyond N. null when no
 *   inequality can be tried (fewer than three positive probabilities), NaN excess for negative or NaN input.
 *
 * Logarithms are added one by one: the product of two probabilities of 1e-200 would be 0.
 * Source: Newton's inequalities; see Pitman 1997, J. Combin. Theory A 77:279.
 */
export function newtonViolation(pmf: ArrayLike<number>, trials: number | null): NewtonViolation | null {
  let first = 0;
  while (first < pmf.length && pmf[first] === 0) first++;
  let last = pmf.length - 1;
  while (last > first && pmf[last] === 0) last--;
  if (trials !== null && last > trials && last < pmf.length) return { excess: Infinity, count: last };
  let worst: NewtonViolation | null = null;
  for (let n = first; n <= last; n++) {
    if (!(pmf[n] >= 0)) return { excess: NaN, count: n };
    if (pmf[n] === 0) return { excess: Infinity, count: n };
    if (n === first || n === last) continue;
    const beyond = trials === null ? 0 : Math.log1p(1 / (trials - n));
    const neighbours = Math.log(pmf[n - 1] / pmf[n]) + Math.log(pmf[n + 1] / pmf[n]);
    const excess = neighbours + Math.log1p(1 / n) + beyond;
    if (worst === null || excess > worst.excess) worst = { excess, count: n };
  }
  return worst;
}
