import type { Diagnosis } from '$lib/stats/types';
import { formatNumber } from '../format-number';
import { sayUnknownCumulants } from './say-unknown-cumulants';

/** What mean and variance of lumped counts can be, in a sentence; nothing without a lump. */
export function sayLumpedLimits(view: Pick<Diagnosis, 'nuisances' | 'data' | 'moments'>): string[] {
  const lumped = view.nuisances?.lumped;
  if (!lumped) return [];
  const range = ({ low, high }: { low: number | null; high: number | null }) =>
    low === null
      ? 'unknown'
      : high === null
        ? `${formatNumber(low)} or more`
        : low === high
          ? formatNumber(low)
          : `from ${formatNumber(low)} to ${formatNumber(high)}`;
  return [
    `Whatever counts the lumped rows hide, the mean of these shots is ${range(lumped.mean)}, their variance ${range(lumped.variance)}.${sayUnknownCumulants(view)}`
  ];
}
