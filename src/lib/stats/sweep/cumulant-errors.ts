import { kStatistics } from '../moments/k-statistics';

/** The first three cumulants of one histogram, unbiased, and how their errors hang together. */
export interface CumulantErrors {
  shots: number;
  /** κ1, κ2, κ3. */
  cumulants: [number, number, number];
  /** Covariance matrix of the three estimates, 3 × 3 row by row. */
  covariance: number[];
}

/**
 * k-statistics k1, k2, k3 of a histogram and the covariance matrix of their sampling errors, by what one shot at
 * distance d from the mean moves each: d, d² − m2, d³ − m3 − 3 m2 d. The matrix is the mean product of these over the
 * shots, divided by S − 1.
 *
 * It agrees with the exact moments of k-statistics (Var k3 = κ6/S + 9(κ2κ4 + κ3²)/(S−1) + …) to order 1/S, and is
 * never indefinite; those, with the sample's own κ6 put in, were so in most histograms of 500 shots.
 *
 * @param counts `[count, shots]`, whole numbers, in any order
 * @returns null under 4 shots, and where the counts take fewer than 4 values: three errors cannot be told apart then
 * @throws RangeError as kStatistics
 *
 * Source: Fisher 1930, Proc. London Math. Soc. 30:199; influence functions: Hampel 1974, J. Am. Stat. Assoc. 69:383.
 */
export function cumulantErrors(counts: readonly (readonly [number, number])[]): CumulantErrors | null {
  const { shots, mean, variance, third } = kStatistics(counts);
  if (shots < 4 || variance === null || third === null) return null;
  if (counts.filter(([, seen]) => seen > 0).length < 4) return null;
  const moment = (r: number) => counts.reduce((sum, [n, seen]) => sum + seen * (n - mean) ** r, 0) / shots;
  const [m2, m3] = [moment(2), moment(3)];
  const covariance = new Array<number>(9).fill(0);
  for (const [n, seen] of counts) {
    const d = n - mean;
    const moved = [d, d * d - m2, d ** 3 - m3 - 3 * m2 * d];
    for (let i = 0; i < 9; i++)
      covariance[i] += (seen * moved[Math.floor(i / 3)] * moved[i % 3]) / (shots * (shots - 1));
  }
  return { shots, cumulants: [mean, variance, third], covariance };
}
