import type { ClaimVerdict, JudgedClaim } from '$lib/stats/claim/judge-claim';
import { formatNumber } from '../format-number';
import { sayInterval } from '../say-interval';
import { sayHowOften } from '../say-p';
import type { Quantity } from './quantities';

/**
 * The finding about one claim in a sentence or two, words first.
 *
 * @param judged null for "less than"
 * @param claim the claimed value
 * @param digit unit it was rounded to when no uncertainty was stated; 0 for one stated, or meant exactly
 */
export function sayClaim(
  quantity: Quantity,
  verdict: ClaimVerdict,
  judged: JudgedClaim | null,
  claim: number,
  digit: number,
  level: number
): string {
  const { interval } = quantity;
  if (interval.value === null) return 'The report gives no value to compare with.';
  const ours = `The report has ${sayInterval(interval, 4)}`;
  if (!judged) {
    const than = `less than ${formatNumber(claim, 3)}`;
    if (verdict === 'agrees') return `${ours}, which is ${than}.`;
    if (verdict === 'disagrees') return `${ours}, which is not ${than}.`;
    return `${ours}: with these resamples it may or may not be ${than}.`;
  }
  const same = rounds(interval.value, claim, digit) ? ' To the digits given it is the same number.' : '';
  if (quantity.lumped && verdict === 'cannot-tell')
    return `${ours}. ${quantity.lumped}, so this cannot settle the claim.${same}`;
  if (judged.distance === null) return `${ours}. On the side of the claim nothing limits it.${same}`;
  const far = `The claim lies ${formatNumber(Math.abs(judged.distance), 2)} times both uncertainties together ${
    judged.distance >= 0 ? 'above' : 'below'
  } that`;
  if (verdict === 'disagrees') {
    const often = Number.isFinite(judged.distance)
      ? `; if it were right, a difference as large ${sayOften(judged.p!)}`
      : ', and both are exact';
    return `${ours}. ${Number.isFinite(judged.distance) ? far : 'The claim differs from that'}${often}.`;
  }
  if (verdict === 'agrees')
    return same ? `${ours}.${same}` : `${ours}. ${far}, within what ${Math.round(100 * level)}\u202f% allow.`;
  const reach =
    judged.halfWidth === null
      ? 'one end of it is open'
      : `it reaches ${formatNumber(judged.halfWidth, 2)} to one side, and differences from ${formatNumber(judged.needed, 2)} on matter`;
  return `${ours}: ${reach}, so a claim wrong by that much would look the same.${same}`;
}

/** Under one in 10¹² nobody counts repeats, and a normal law is no guide that far out. */
const sayOften = (p: number): string => (p < 1e-12 ? 'would practically never turn up' : sayHowOften(p));

/** Whether the report's value, rounded as the claim is, gives the claim: half a unit of its last digit either way. */
const rounds = (value: number, claim: number, digit: number): boolean =>
  digit > 0 && Math.abs(value - claim) <= 0.5000001 * digit;
