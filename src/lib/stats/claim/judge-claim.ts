import { normalQuantile } from '../numerics/normal-quantile';
import { logNormalTail } from '../numerics/log-normal-tail';
import type { Interval } from '../types';

/** A number somebody states, as a value with its standard uncertainty; 0 for one stated as exact. */
export interface Claim {
  value: number;
  sigma: number;
}

export interface ClaimRules {
  /** Confidence at which a claim is called wrong: 0.95 or 0.99. */
  level: number;
  /** Smallest difference that matters, in the claim's own units; its own 95 % half-width counts when larger. */
  matters: number;
}

export type ClaimVerdict = 'agrees' | 'disagrees' | 'cannot-tell';

export interface JudgedClaim {
  verdict: ClaimVerdict;
  /** Claim minus data, in standard uncertainties of both together; null where the data set no limit on that side. */
  distance: number | null;
  /** Two-sided probability of a distance at least as large if the claim were right; null with the distance. */
  p: number | null;
  /** The wider half of the data's own 95 % interval; null when one end is open. */
  halfWidth: number | null;
  /** The half-width up to which the data can tell. */
  needed: number;
}

/** Half-width of a 95 % interval in standard uncertainties. */
const Z95 = -normalQuantile(0.025);

/**
 * Compares a claim with a value and its 95 % interval.
 *
 * The data's standard uncertainty on the side where the claim lies is u = (limit − value)/1.96, the claim's is σ, and
 * both are taken as independent: z = (claim − value)/√(u² + σ²).
 * - `disagrees`: |z| exceeds the two-sided normal quantile of `level`.
 * - `cannot-tell`: it does not, but the wider half of the data's interval exceeds max(matters, 1.96 σ): a claim wrong
 *   by as much as that could have passed. So it is too where the interval is open on the side of the claim.
 * - `agrees`: otherwise.
 *
 * With intervals that cover, a right claim is called wrong in at most 1 − level of all cases; a claim worked out from
 * the same shots as the data errs with them, and is then called wrong less often still.
 *
 * @returns `cannot-tell` with nulls when the data have no value, or no limit on the claim's side
 * @throws RangeError for a claim that is not finite, a negative σ or `matters`, or a level outside 0 … 1
 *
 * Source: GUM, JCGM 100:2008, 5.1.2, for adding uncertainties (m); a limit on each side by itself: Barlow 2004,
 * arXiv:physics/0406120 (m).
 */
export function judgeClaim(
  data: Interval,
  { value, sigma }: Claim,
  { level, matters }: ClaimRules
): JudgedClaim {
  if (!Number.isFinite(value)) throw new RangeError(`not a finite claim: ${value}`);
  for (const size of [sigma, matters]) if (!(size >= 0)) throw new RangeError(`not a size: ${size}`);
  if (!(level > 0 && level < 1)) throw new RangeError(`not a level: ${level}`);

  const needed = Math.max(matters, Z95 * sigma);
  const halfWidth =
    data.value === null || data.low === null || data.high === null
      ? null
      : Math.max(data.high - data.value, data.value - data.low);
  const limit = data.value === null ? null : value >= data.value ? data.high : data.low;
  if (data.value === null || limit === null) {
    return { verdict: 'cannot-tell', distance: null, p: null, halfWidth, needed };
  }
  const difference = value - data.value;
  const spread = Math.hypot((limit - data.value) / Z95, sigma);
  // Both exact: equal or not.
  const distance = difference === 0 ? 0 : difference / spread;
  const p = Math.min(1, 2 * Math.exp(logNormalTail(Math.abs(distance))));
  const wrong = Math.abs(distance) > -normalQuantile((1 - level) / 2);
  const verdict = wrong ? 'disagrees' : halfWidth === null || halfWidth > needed ? 'cannot-tell' : 'agrees';
  return { verdict, distance, p, halfWidth, needed };
}
