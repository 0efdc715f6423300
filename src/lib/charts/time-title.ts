import type { SweepReport } from '$lib/stats/sweep/types';

/** What the axis of a sweep is called: "quench time, µs". */
export const timeTitle = ({ axis, timeUnit }: Pick<SweepReport, 'axis' | 'timeUnit'>): string =>
  `${axis === 'quench-time' ? 'quench time' : 'hold time'}${timeUnit ? `, ${timeUnit}` : ''}`;
