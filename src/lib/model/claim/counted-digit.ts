import type { Claimed } from './read-claimed';
import type { Quantity } from './quantities';

/**
 * The unit that a claim without a stated uncertainty was rounded to; half of it either way is what its digits leave
 * open. 0 for a claim that is meant exactly.
 *
 * A whole number for a p, a ratio or a divergence is exact. No claim counts as rounded more coarsely than to one digit
 * at the scale of the quantity: "1" is no mean of 0.3, although 0.3 is nearer to 1 than half a unit.
 */
export function countedDigit({ interval, wholeIsExact }: Quantity, { lastDigit }: Claimed): number {
  if (wholeIsExact && lastDigit >= 1) return 0;
  const scale = Math.abs(interval.value || interval.high || 0);
  return scale === 0 ? 0 : Math.min(lastDigit, 10 ** Math.floor(Math.log10(scale)));
}
