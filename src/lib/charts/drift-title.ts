import { formatCount } from '$lib/model/format-number';
import type { DriftPart } from '$lib/stats/drift/types';

/** What the chart of means over time shows, as its title. */
export function driftTitle({ means }: DriftPart): string {
  const outside = means.filter((point) => point.outside).length;
  return outside === 0
    ? 'The mean stays within its limits from the first shot to the last'
    : `The mean leaves its limits in ${formatCount(outside)} of ${formatCount(means.length)} stretches of shots`;
}
