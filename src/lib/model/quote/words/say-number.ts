import type { Interval } from '$lib/stats/types';
import { asGiven } from '../numbers/as-given';
import type { QuotedNumber } from '../numbers/quoted-number';
import { roundAt } from '../numbers/round-at';
import { roundToDigits } from '../numbers/round-to-digits';
import { roundToUncertainty } from '../numbers/round-to-uncertainty';
import { equation, number, text, words, type Span, type Words } from '../span';

/** A whole number. */
export const whole = (value: number): Span => number(roundAt(value, 0));

/** "26 306 shots", "one shot". */
export const counted = (value: number, one: string, many = `${one}s`): Words =>
  value === 1 ? [text(`one ${one}`)] : words`${whole(value)} ${many}`;

/** A setting with the digits it was given. */
export const given = (value: number): Span => number(asGiven(value));

/** A share as per cent with two significant digits. */
export const percent = (share: number): Words => words`${number(roundToDigits(100 * share, 2))}\u202f%`;

/** A share that was set, as per cent with its own digits; 100 · 0.07 would end in a 1 otherwise. */
export const givenPercent = (share: number): Words =>
  words`${given(Number((100 * share).toPrecision(12)))}\u202f%`;

/** "p = 0.35"; at the smallest p that could be shown "p ≤ 0.00050". Two significant digits. */
export const sayPValue = (p: number, atMost: boolean): Span => equation('p', atMost ? '≤' : '=', pNumber(p));

/** Two digits, but 1 is 1. */
const pNumber = (p: number): QuotedNumber => (p === 1 ? asGiven(1) : roundToDigits(p, 2));

/**
 * "4.052 (95 % interval 4.033 to 4.072)", rounded to its uncertainty; missing limits are said.
 *
 * @param symbol set before it, with an equals sign
 */
export function sayRounded(interval: Interval, symbol: string | null = null): Words {
  const rounded = roundToUncertainty(interval);
  if (!rounded) return [text('not defined')];
  const { low, high } = rounded;
  const value = symbol === null ? number(rounded.value) : equation(symbol, '=', rounded.value);
  if (low && high) return words`${value} (95\u202f% interval ${number(low)} to ${number(high)})`;
  if (low) return words`${value} (95\u202f% interval from ${number(low)} up, without an upper limit)`;
  if (high) return words`${value} (95\u202f% interval up to ${number(high)}, without a lower limit)`;
  return words`${value} (no interval can be given)`;
}
