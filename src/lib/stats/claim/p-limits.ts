import { clopperPearson } from '../numerics/clopper-pearson';
import { poissonInterval } from '../numerics/poisson-interval';
import type { Interval, TestResult } from '../types';

/**
 * A p-value with the 95 % interval that its own resamples leave: what more resamples, or another seed, could make it.
 *
 * Of B draws k were as extreme, p = (k + 1)/(B + 1): Clopper–Pearson for k of B. Ended early at the 100th such draw,
 * p = 100/draws: the draws are negative binomial, and an exact Poisson interval for 100 stands in, a little too wide
 * (p is then above 0.05, so at most by a factor 1/√(1 − p)). An exact or limiting p has no such play.
 *
 * Source: Clopper & Pearson 1934, Biometrika 26:404; Besag & Clifford 1991, Biometrika 78:301.
 */
export function pLimits(test: Pick<TestResult, 'p' | 'source' | 'resamples' | 'stoppedEarly'>): Interval {
  const { p, source, resamples, stoppedEarly } = test;
  if (source === 'exact' || source === 'limit' || resamples === 0) return { value: p, low: p, high: p };
  if (stoppedEarly) {
    const { low, high } = poissonInterval(Math.round(p * resamples), 0.95);
    return { value: p, low: low / resamples, high: Math.min(1, high / resamples) };
  }
  const exceeded = Math.max(0, Math.min(resamples, Math.round(p * (resamples + 1)) - 1));
  const { low, high } = clopperPearson(exceeded, resamples);
  return { value: p, low: Math.min(low, p), high: Math.max(high, p) };
}
