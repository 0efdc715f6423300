import { normalQuantile } from '../numerics/normal-quantile';

/** A rate, and the interval in which it lies but for the chance `miss`. */
export interface RateLimits {
  rate: number;
  uncertainty: number;
  miss: number;
  low: number;
  high: number;
  cutByCounts: boolean;
}

/**
 * Interval of a misread rate with a normal error, at 1 − β: ε ± z_{1−β/2}·u, cut at 0 and at the largest rate that the
 * counts allow. β is a hundredth of the level α of the answer: fixed before any p is looked at, and small enough that
 * adding it to each of eight tests costs less than a tenth of α.
 *
 * @param uncertainty standard uncertainty u of the rate
 * @param largest what the counts allow at most
 * @returns null where even the lower end is more than the counts allow
 * Source: Berger & Boos 1994, J. Am. Stat. Assoc. 89:1012 (m).
 */
export function rateLimits(
  rate: number,
  uncertainty: number,
  largest: number,
  alpha: number
): RateLimits | null {
  const miss = alpha / 100;
  const reach = -normalQuantile(miss / 2) * uncertainty;
  const low = Math.max(0, rate - reach);
  if (low > largest) return null;
  const cutByCounts = rate + reach > largest;
  const high = cutByCounts ? largest : rate + reach;
  return { rate: Math.min(rate, high), uncertainty, miss, low, high, cutByCounts };
}
