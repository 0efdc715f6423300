import { findRoot } from '../numerics/find-root';
import { logGammaTail } from '../numerics/log-gamma-tail';

/**
 * Factors between an observed variance/ceiling and its limits when the counts scatter as equal trials do:
 * (S − 1)·D/(1 − 1/N) is then close to chi-square with f = (S − 1)/(1 − 1/N) degrees of freedom, so the limits are
 * D·f/χ²_{1−tail}(f) and D·f/χ²_{tail}(f).
 *
 * For the variance and for variance/mean of equal trials the scatter is never less (their relative variances
 * exceed 2(1 − 1/N)/S by (1 − 4pq)/(Npq) and by p²/(Npq), over S), so there the factors are on the short side.
 *
 * @param shots S ≥ 2
 * @param trials N ≥ 2, or null for unknown (then f = S − 1)
 * @param tail probability beyond each limit, 0 < tail < 0.25
 *
 * Source: Fisher 1925, Statistical Methods for Research Workers (index of dispersion) (m).
 */
export function evenDispersionFactors(
  shots: number,
  trials: number | null,
  tail: number
): { low: number; high: number } {
  const freedom = (shots - 1) / (trials === null ? 1 : 1 - 1 / trials);
  const quantile = (side: 'lower' | 'upper') =>
    // In the logarithm of χ²/f: with one degree of freedom the lower quantile is near 1e-3, with many near 1.
    Math.exp(
      findRoot(
        (u) => logGammaTail(side, freedom / 2, (freedom / 2) * Math.exp(u)) - Math.log(tail),
        side === 'lower' ? 2 * Math.log(tail) - 2 : 0,
        side === 'lower' ? 0 : Math.log(1 - 3 * Math.log(tail)),
        1e-12
      )
    );
  return { low: 1 / quantile('upper'), high: 1 / quantile('lower') };
}
