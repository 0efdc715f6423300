import type { SweepReport } from '$lib/stats/sweep/types';

/** What a sweep is called that nobody named: "Quench times 1 to 100 µs". */
export function sweepName({
  axis,
  timeUnit,
  points
}: Pick<SweepReport, 'axis' | 'timeUnit' | 'points'>): string {
  const [first, last] = [points[0], points[points.length - 1]].map(({ time }) => Number(time.toPrecision(4)));
  return `${axis === 'quench-time' ? 'Quench' : 'Hold'} times ${first} to ${last}${timeUnit ? ` ${timeUnit}` : ''}`;
}
