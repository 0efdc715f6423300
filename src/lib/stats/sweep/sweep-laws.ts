import { normalQuantile } from '../numerics/normal-quantile';
import { commonExponent } from './common-exponent';
import type { SweepPoint } from './fit-power-laws';
import { normalInterval } from './normal-interval';
import type { SweepLaws } from './types';

/** Power laws of the points of a window as the document tells them; null where none can be fitted. */
export function sweepLaws(points: SweepPoint[]): SweepLaws | null {
  const found = commonExponent(points);
  if (!found) return null;
  const { quantities, free, tied, chiSquare, freedom, p } = found;
  return {
    quantities,
    exponents: free.exponents.map((exponent, q) => normalInterval(exponent, free.errors[q])),
    logLevels: free.logLevels,
    middle: free.middle,
    chiSquare: free.chiSquare,
    freedom: free.freedom,
    p: free.p,
    common: {
      exponent: normalInterval(tied.exponents[0], tied.errors[0]),
      logLevels: tied.logLevels,
      chiSquare,
      freedom,
      p,
      z: p < 1 ? -normalQuantile(p / 2) : 0
    }
  };
}
