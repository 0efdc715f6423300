import { judgeBound } from '$lib/stats/claim/judge-bound';
import { judgeClaim, type ClaimVerdict } from '$lib/stats/claim/judge-claim';
import type { Quantity } from './quantities';
import { readClaimed } from './read-claimed';
import { sayClaim } from './say-claim';

/** What a referee typed. */
export interface TypedClaim {
  value: string;
  /** Stated uncertainty; empty when none is stated. */
  uncertainty: string;
  /** What that uncertainty is. */
  kind: 'one-sigma' | 'ninety-five';
}

export interface ClaimSettings {
  level: number;
  /** Smallest difference that matters, as a share of the claim. */
  share: number;
}

export type CheckedClaim =
  | { ok: true; verdict: ClaimVerdict; sentence: string }
  | { ok: false; field: 'value' | 'uncertainty'; problem: string };

/** A p-value is told from another by a factor, not by tenths: half of it matters. */
const SHARE_OF_P = 0.5;

/**
 * Checks one typed claim against its quantity; see judgeClaim. Without a stated uncertainty the digits given are it:
 * half a unit of the last one, even over its width, σ = unit/√12.
 */
export function checkClaim(
  quantity: Quantity,
  typed: TypedClaim,
  { level, share }: ClaimSettings
): CheckedClaim {
  const claimed = readClaimed(typed.value);
  if (!claimed) return bad('value', 'is not a number such as 4.05 or 2.5e-4.');
  const { value, below, lastDigit } = claimed;
  if (quantity.positive && value < 0) return bad('value', 'cannot be negative.');
  if (quantity.isP && value > 1) return bad('value', 'cannot be above 1.');
  if (below && !quantity.isP) return bad('value', '“less than” can be checked for p-values only.');
  const stated = typed.uncertainty.trim() === '' ? null : readClaimed(typed.uncertainty);
  if (typed.uncertainty.trim() !== '' && (!stated || stated.value < 0 || stated.below))
    return bad('uncertainty', 'is not a number from 0 up; leave it empty when none is stated.');

  if (below) {
    const verdict = judgeBound(quantity.interval, value);
    return { ok: true, verdict, sentence: sayClaim(quantity, verdict, null, claimed, level) };
  }
  const sigma = stated ? stated.value / (typed.kind === 'ninety-five' ? 1.959964 : 1) : 0;
  const matters = Math.abs(value) * (quantity.isP ? SHARE_OF_P : share);
  const judged = judgeClaim(
    quantity.interval,
    { value, sigma: Math.hypot(sigma, lastDigit / Math.sqrt(12)) },
    { level, matters }
  );
  return {
    ok: true,
    verdict: judged.verdict,
    sentence: sayClaim(quantity, judged.verdict, judged, claimed, level)
  };
}

const bad = (field: 'value' | 'uncertainty', problem: string): CheckedClaim => ({
  ok: false,
  field,
  problem
});
