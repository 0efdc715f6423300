/**
 * Limits of a bootstrap-t interval: estimate − t·error at the two outer quantiles of t = (value* − estimate)/error*.
 *
 * @param estimate the statistic of the data, and `error` its standard error
 * @param values the statistic of each resample, and `errors` its standard error; NaN where not defined
 * @param tail probability outside each limit, e.g. 0.025
 * @returns `[low, high]`, −Infinity or Infinity where the resamples set no limit: when a share above `tail` of
 *   them had no spread at all (t is then infinite), or when there are fewer than 1/tail − 1 of them. Where the
 *   error itself is zero though the data vary (the variance of two counts seen equally often), the quantiles of
 *   the resampled values stand in
 *
 * Source: Efron & Tibshirani 1993, An Introduction to the Bootstrap, ch. 12.5.
 */
export function studentisedLimits(
  estimate: number,
  error: number,
  values: Float64Array,
  errors: Float64Array,
  tail: number
): [number, number] {
  if (!(error > 1e-12 * Math.abs(estimate))) {
    const sorted = values.slice().sort();
    return [quantile(sorted, tail), quantile(sorted, 1 - tail)];
  }
  const t = new Float64Array(values.length);
  for (let b = 0; b < values.length; b++) {
    const distance = values[b] - estimate;
    // Rounding leaves some 1e-16 of an error where there is none.
    if (errors[b] > 1e-9 * error) t[b] = distance / errors[b];
    // Undefined means that all shots of the resample were at 0 (or at N): no variance, hence below.
    else t[b] = distance > 0 ? Infinity : distance === 0 ? 0 : -Infinity;
  }
  t.sort();
  return [estimate - error * quantile(t, 1 - tail), estimate - error * quantile(t, tail)];
}

/** Quantile at place q(B + 1) of the sorted values, straight between neighbours; infinite beyond the ends. */
function quantile(sorted: Float64Array, q: number): number {
  const place = q * (sorted.length + 1);
  // 0.025 · 2000 comes out as 50.000000000000004 or so.
  const below = Math.floor(place + 1e-9);
  const share = place - below;
  if (below < 1) return -Infinity;
  if (share < 1e-9) return sorted[below - 1];
  if (below >= sorted.length) return Infinity;
  // Between an infinity and a number only the infinity is safe: the caller then knows of no limit.
  for (const end of [sorted[below - 1], sorted[below]]) if (!Number.isFinite(end)) return end;
  return sorted[below - 1] + share * (sorted[below] - sorted[below - 1]);
}
