import type { Explanation } from '$lib/stats/explanations/types';
import { formatNumber } from '../format-number';

/**
 * "ρ = 0.016 (95 %: 0.015 to 0.016)"; an end that is the end of its range is said to be, and that two settings are taken
 * to have equal shares; '' for independent trials.
 */
export function sayOwnNumber({
  id,
  parameter,
  second
}: Pick<Explanation, 'id' | 'parameter' | 'second'>): string {
  if (parameter === null) return '';
  const { symbol, value, low, high, atBound } = parameter;
  const end = (at: number, side: 'low' | 'high') =>
    `${formatNumber(at, 3)}${atBound === side || atBound === 'both' ? ', the end of its range' : ''}`;
  const other = second === null ? '' : `, ${second.symbol} ${formatNumber(second.value, 2)}`;
  return `${symbol} = ${formatNumber(value, 3)} (95\u202f%: ${end(low, 'low')} to ${end(high, 'high')})${other}${id === 'two-settings' ? ', of equal shares' : ''}`;
}
