import type { DistributionPoint } from '$lib/stats/types';

/**
 * How far the law lies from an observed share, in half-intervals: the distance divided by the half of the
 * 95 % interval on that side. Within −1 … 1 the interval holds the law; above 0 the count was seen more
 * often than the law says. A share of exactly the law gives 0.
 */
export function residualOf({ observed, low, high, fitted }: DistributionPoint): number {
  const distance = observed - fitted;
  const half = distance > 0 ? observed - low : high - observed;
  return half > 0 ? distance / half : 0;
}
