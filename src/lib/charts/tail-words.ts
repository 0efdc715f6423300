import type { TailPoint } from '$lib/stats/types';
import { formatCount } from '$lib/model/format-number';
import { sayShare } from './say-share';

const limit = (value: number): string => (value === 0 ? '0' : sayShare(value));

/** One tail read out in words. */
export function tailWords(point: TailPoint, shots: number): string {
  const name = `${formatCount(point.count)} or ${point.side === 'high' ? 'more' : 'fewer'}`;
  const seen =
    point.shots === 0
      ? `never seen in ${formatCount(shots)} shots (95 % upper limit ${limit(point.high)})`
      : `seen in ${formatCount(point.shots)} of ${formatCount(shots)} shots, ${sayShare(point.observed)} ` +
        `(95 % interval ${limit(point.low)} to ${limit(point.high)})`;
  const bound =
    point.hoeffding >= 1
      ? ''
      : point.low > point.hoeffding
        ? ` Above Hoeffding’s bound for this mean, ${limit(point.hoeffding)}.`
        : ` No independent trials with this mean give more than ${limit(point.hoeffding)}.`;
  return `${name}: ${seen}. Best law ${limit(point.fitted)}.${bound}`;
}
