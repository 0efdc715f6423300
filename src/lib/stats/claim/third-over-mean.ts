import { normalQuantile } from '../numerics/normal-quantile';
import type { Diagnosis, Interval } from '../types';

const Z95 = -normalQuantile(0.025);

/**
 * κ3/κ1 with a 95 % interval, from the intervals of a document, which has none of its own.
 *
 * Delta method, side by side: with r = k3/k1, u the standard uncertainty of k3 on one side (its limit less its value,
 * over 1.96), Var k1 = κ2/S and Cov(k1, k3) = κ4/S, which is exact for k-statistics,
 *
 *   u_r² = [u² − 2 r κ4/S + r² κ2/S]/κ1².
 *
 * The covariance is kept within ±u √(κ2/S), or estimates at odds with each other could make u_r² negative; it is taken
 * at its unfavourable end when there is no fourth cumulant.
 *
 * @param moments of a document, the third widened by carefulThird
 * @param shots S
 * @returns null where the mean is 0, and where the third cumulant has no value or limit
 *
 * Source: Fisher 1929, Proc. London Math. Soc. 30:199 (moments of k-statistics); Kendall & Stuart, ch. 10 and 12 (m).
 */
export function thirdOverMean(
  {
    mean,
    variance,
    third,
    fourth
  }: Pick<Diagnosis['moments'], 'mean' | 'variance' | 'third'> & {
    fourth: Interval | null;
  },
  shots: number
): Interval {
  if (mean.value === null || mean.value === 0 || third.value === null || variance.value === null) {
    return { value: null, low: null, high: null };
  }
  const ratio = third.value / mean.value;
  const varianceOfMean = variance.value / shots;
  const reach = (limit: number | null): number | null => {
    if (limit === null) return null;
    const error = Math.abs(limit - third.value!) / Z95;
    const most = error * Math.sqrt(varianceOfMean);
    const covariance =
      fourth === null || fourth.value === null
        ? -Math.sign(ratio) * most
        : Math.max(-most, Math.min(most, fourth.value / shots));
    const square = error * error - 2 * ratio * covariance + ratio * ratio * varianceOfMean;
    return (Z95 * Math.sqrt(Math.max(0, square))) / mean.value!;
  };
  const [below, above] = [reach(third.low), reach(third.high)];
  return {
    value: ratio,
    low: below === null ? null : ratio - below,
    high: above === null ? null : ratio + above
  };
}
