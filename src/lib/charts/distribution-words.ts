import type { DistributionPoint } from '$lib/stats/types';
import { formatCount } from '$lib/model/format-number';
import { sayShare } from './say-share';
import { standing } from './standing';

const VERDICT = {
  within: 'The interval holds the law.',
  more: 'Seen more often than the law says.',
  fewer: 'Seen less often than the law says.'
};

/** One count read out in words. */
export function distributionWords(point: DistributionPoint, shots: number): string {
  const lumped = point.below ? ' or fewer' : point.lump ? ' or more' : '';
  const name = `Count ${formatCount(point.count)}${lumped}`;
  const seen =
    point.shots === 0
      ? 'never seen'
      : `seen in ${formatCount(point.shots)} of ${formatCount(shots)} shots, ${sayShare(point.observed)}`;
  const interval = `95 % interval ${point.low === 0 ? '0' : sayShare(point.low)} to ${sayShare(point.high)}`;
  return `${name}: ${seen} (${interval}). Best law ${sayShare(point.fitted)}. ${VERDICT[standing(point)]}`;
}
