/** One inequality that printed cumulants are held against. */
export interface Condition {
  /** The cumulant it limits, given those before it: 1 … 4. */
  order: 1 | 2 | 3 | 4;
  side: 'floor' | 'ceiling';
  value: number;
  limit: number;
  /** How far inside the limit the value lies; negative outside. */
  slack: number;
  /** Standard error of the slack from the printed errors, taken as independent of each other. */
  error: number;
  /** `moot`: a lower cumulant is already impossible, so that nothing can be said of this one. */
  standing: 'holds' | 'broken' | 'moot';
}

type Limits = (cumulants: number[]) => { low: number; high: number }[];

/**
 * Holds cumulants against the limits of one kind of counts, one after the other.
 *
 * @param limits limits of κ1, κ2, … each given those before it; infinite ones are left out
 * @returns floors and ceilings in order. Broken means by more than rounding, 1e-12 of the largest number at hand;
 *   error by differences over a thousandth of each printed error.
 */
export function conditionsOf(values: number[], errors: number[], limits: Limits): Condition[] {
  const at = limits(values);
  const blur = 1e-12 * values.reduce((sum, value) => sum + Math.abs(value), 1e-300);
  const slackOf = (cumulants: number[], i: number, side: 'floor' | 'ceiling') => {
    const limit = limits(cumulants)[i];
    return side === 'floor' ? cumulants[i] - limit.low : limit.high - cumulants[i];
  };
  let impossible = false;
  const found: Condition[] = [];
  at.forEach(({ low, high }, i) => {
    let broken = false;
    for (const side of ['floor', 'ceiling'] as const) {
      const limit = side === 'floor' ? low : high;
      if (!impossible && !Number.isFinite(limit)) continue;
      const slack = side === 'floor' ? values[i] - low : high - values[i];
      const error = Math.sqrt(
        errors.reduce((sum, sigma, j) => {
          if (j > i) return sum;
          const moved = (by: number) => values.map((value, k) => (k === j ? value + by : value));
          const h = sigma / 1000;
          const slope = (slackOf(moved(h), i, side) - slackOf(moved(-h), i, side)) / (2 * h);
          return sum + (Number.isFinite(slope) ? slope * sigma : 0) ** 2;
        }, 0)
      );
      const standing = impossible ? 'moot' : slack < -blur ? 'broken' : 'holds';
      broken ||= standing === 'broken';
      found.push({
        order: (i + 1) as Condition['order'],
        side,
        value: values[i],
        limit: impossible ? NaN : limit,
        slack: impossible ? NaN : slack,
        error: impossible ? NaN : error,
        standing
      });
    }
    impossible ||= broken;
  });
  return found;
}
