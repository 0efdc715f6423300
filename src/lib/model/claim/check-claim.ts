import { judgeBound } from '$lib/stats/claim/judge-bound';
import { judgeClaim, type ClaimVerdict } from '$lib/stats/claim/judge-claim';
import { countedDigit } from './counted-digit';
import type { Quantity } from './quantities';
import { readClaimed, type Claimed } from './read-claimed';
import { sayClaim } from './say-claim';

/** What a referee typed. */
export interface TypedClaim {
  value: string;
  /** Stated uncertainty; empty when none is stated, or when it stands in brackets after the value. */
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
 * Checks one typed claim against its quantity; see judgeClaim. A stated uncertainty, 0 too, is taken as it stands; it
 * may be in brackets after the value. Only where none is stated do the digits given count: half a unit of the last one
 * (see countedDigit), even over its width, σ = unit/√12.
 */
export function checkClaim(
  quantity: Quantity,
  typed: TypedClaim,
  { level, share }: ClaimSettings
): CheckedClaim {
  const claimed = readClaimed(typed.value);
  if (!claimed) return bad('value', 'is not a number such as 4.05, 8.45(12) or 2.5e-4.');
  const { value, below } = claimed;
  if (quantity.positive && value < 0) return bad('value', 'cannot be negative.');
  if (quantity.isP && value > 1) return bad('value', 'cannot be above 1.');
  if (below && !quantity.isP) return bad('value', '“less than” can be checked for p-values only.');
  const apart = typed.uncertainty.trim() === '' ? null : readClaimed(typed.uncertainty);
  if (
    typed.uncertainty.trim() !== '' &&
    (!apart || apart.value < 0 || apart.below || apart.bracketed !== null)
  )
    return bad('uncertainty', 'is not a number from 0 up; leave it empty when none is stated.');
  if (apart && claimed.bracketed !== null)
    return bad('uncertainty', 'stands in brackets after the value already; leave this empty.');

  const read = sayRead(claimed, apart);
  if (below) {
    const verdict = judgeBound(quantity.interval, value);
    return { ok: true, verdict, sentence: sayClaim(quantity, verdict, null, value, 0, level) + read };
  }
  const stated = apart?.value ?? claimed.bracketed;
  const digit = stated === null ? countedDigit(quantity, claimed) : 0;
  const sigma =
    stated === null ? digit / Math.sqrt(12) : stated / (typed.kind === 'ninety-five' ? 1.959964 : 1);
  const matters = Math.abs(value) * (quantity.isP ? SHARE_OF_P : share);
  const judged = judgeClaim(quantity.interval, { value, sigma }, { level, matters });
  const { verdict } = judged;
  return { ok: true, verdict, sentence: sayClaim(quantity, verdict, judged, value, digit, level) + read };
}

/** How a comma was read that may have been meant to part thousands. */
function sayRead(value: Claimed, uncertainty: Claimed | null): string {
  const said = [
    value.readAs && ` The claim was read as ${value.readAs}.`,
    uncertainty?.readAs && ` The uncertainty was read as ${uncertainty.readAs}.`
  ];
  return said.filter(Boolean).join('');
}

const bad = (field: 'value' | 'uncertainty', problem: string): CheckedClaim => ({
  ok: false,
  field,
  problem
});
