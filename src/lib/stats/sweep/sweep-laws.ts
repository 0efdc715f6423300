import { logGammaTail } from '../numerics/log-gamma-tail';
import { commonExponent } from './common-exponent';
import type { SweepPoint } from './fit-power-laws';
import { floorChance } from './floor-chance';
import { normalInterval } from './normal-interval';
import { surpriseInErrors } from './surprise-in-errors';
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
    p: floorChance(free.p),
    common: {
      exponent: normalInterval(tied.exponents[0], tied.errors[0]),
      logLevels: tied.logLevels,
      chiSquare,
      freedom,
      p: floorChance(p),
      z: surpriseInErrors(chiSquare > 0 ? logGammaTail('upper', freedom / 2, chiSquare / 2) : 0)
    }
  };
}
