import { formatPercent } from '../format-number';

/** A weight as per cent; further digits of a weight near 0 or 1 mean nothing. */
export function sayWeight(weight: number): string {
  if (weight < 0.001) return `< 0.1\u202f%`;
  return weight > 0.999 ? `> 99.9\u202f%` : formatPercent(weight);
}
