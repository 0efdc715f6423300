import type { DistributionPoint } from '$lib/stats/types';
import { formatCount } from './format-number';

/** A row of the distribution by its count: "4", "10+" for a lump, "0–2" for an opening row. */
export const countLabel = ({
  count,
  lump,
  below
}: Pick<DistributionPoint, 'count' | 'lump' | 'below'>): string =>
  below ? `0–${formatCount(count)}` : formatCount(count) + (lump ? '+' : '');
