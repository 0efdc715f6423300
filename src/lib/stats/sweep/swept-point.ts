import { cumulantErrors } from './cumulant-errors';
import { factorPair } from './factor-pair';
import { normalInterval } from './normal-interval';
import type { KnownInterval, SweepInput, SweepOptions, SweptPoint } from './types';

/**
 * What a sweep keeps of one dataset: its first three cumulants with the covariance of their errors, so that any window can
 * be fitted without the counts, and ratios of them with intervals by the delta method.
 *
 * @param axis F2/F1² is told for hold times alone, where it is the question
 */
export function sweptPoint(
  { label, time, counts, trials, misread, dataset }: SweepInput,
  axis: SweepOptions['axis']
): Omit<SweptPoint, 'inWindow'> {
  const shots = counts.reduce((sum, [, seen]) => sum + seen, 0);
  const place = {
    ...{ label, time, shots },
    ...(trials !== undefined && { trials }),
    ...(misread !== undefined && { misread }),
    ...(dataset && { dataset })
  };
  const held = axis === 'hold-time';
  const known = cumulantErrors(counts);
  if (!known)
    return { ...place, cumulants: null, ratios: null, ...(held && { pairFactor: null }), covariance: null };
  const { cumulants, covariance: v } = known;
  const interval = (q: number) => normalInterval(cumulants[q], Math.sqrt(v[4 * q]));
  const ofMean = (q: number) =>
    ratio({ x: cumulants[0], y: cumulants[q], varX: v[0], varY: v[4 * q], covariance: v[q] });
  return {
    ...place,
    cumulants: [interval(0), interval(1), interval(2)],
    ratios: [ofMean(1), ofMean(2)],
    ...(held && { pairFactor: ratio(factorPair(known)) }),
    covariance: v
  };
}

function ratio({
  x,
  y,
  varX,
  varY,
  covariance
}: Omit<ReturnType<typeof factorPair>, 'weight'>): KnownInterval {
  const r = y / x;
  return normalInterval(r, Math.sqrt(varY - 2 * r * covariance + r * r * varX) / Math.abs(x));
}
