import { clopperPearson } from '../numerics/clopper-pearson';
import { poissonInterval } from '../numerics/poisson-interval';

/**
 * Limits of the mean count from the total count of all shots, exact for independent trials: the total is then a sum
 * of S·N trials, and its Clopper–Pearson interval (N unknown: Garwood's for a Poisson count) covers whatever the
 * probabilities are (Hoeffding 1956). For data so sparse that resampling sets no limit.
 *
 * @param total sum of the counts of all shots
 * @param shots S ≥ 1
 * @param trials N, or null when unknown
 * @param level confidence, 0 < level < 1
 */
export function meanLimits(
  total: number,
  shots: number,
  trials: number | null,
  level: number
): { low: number; high: number } {
  if (trials === null) {
    const { low, high } = poissonInterval(total, level);
    return { low: low / shots, high: high / shots };
  }
  const { low, high } = clopperPearson(total, shots * trials, level);
  return { low: low * trials, high: high * trials };
}
