import type { Interval } from '../types';
import { formatNumber } from './format-number';

/** "1.24 (95 %: 1.15 to 1.33)"; a missing end is said. */
export function sayInterval({ value, low, high }: Interval, digits = 4): string {
  const number = (x: number) => formatNumber(x, digits);
  if (value === null) return '–';
  if (low === null && high === null) return `${number(value)} (no interval can be given)`;
  if (high === null) return `${number(value)} (95\u202f%: ${number(low!)} and up)`;
  if (low === null) return `${number(value)} (95\u202f%: at most ${number(high)})`;
  return `${number(value)} (95\u202f%: ${number(low)} to ${number(high)})`;
}
