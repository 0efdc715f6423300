import type { CumulantsVerdict } from '$lib/stats/cumulants-only/judge-cumulants';
import type { Measured, PublishedCumulants } from '$lib/stats/cumulants-only/published-cumulants';
import type { CumulantsPlace } from './cumulants-place';

/** Printed cumulants in the plane of κ2/κ1 and κ3/κ1; null where they have no place in it. */
export function publishedPlace(
  { trials, mean, variance, third }: PublishedCumulants,
  { verdict, nearest }: CumulantsVerdict
): CumulantsPlace | null {
  if (!third || !(mean.value > 0) || verdict === 'impossible') return null;
  const share = trials === null ? 0 : mean.value / trials;
  if (!(share < 1)) return null;
  const ratio = (of: Measured) => {
    const value = of.value / mean.value;
    // To first order, the errors independent of each other.
    const reach = (1.96 * Math.hypot(of.error, value * mean.error)) / mean.value;
    return { value, low: value - reach, high: value + reach };
  };
  const fano = ratio(variance);
  const [k1, k2, k3] = nearest.cumulants;
  const far = fano.low > 1 - share ? 'more' : 'outside';
  return {
    share,
    fano,
    third: ratio(third),
    law: { fano: k1 > 0 ? k2 / k1 : 0, third: k1 > 0 ? k3 / k1 : 0, name: 'nearest that trials reach' },
    standing: nearest.distance === 0 ? 'inside' : verdict === 'ruled-out' ? far : 'near',
    beyond: null
  };
}
