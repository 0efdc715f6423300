import type { SweepReport } from '$lib/stats/sweep/types';

type Span = [low: number, high: number];

/** From where to where the axes of a sweep go: a little beyond its times, and beyond the cumulants that are above 0. */
export function sweepSpan({ points }: Pick<SweepReport, 'points'>): { times: Span; values: Span } {
  const times = points.map(({ time }) => time);
  const known = points.flatMap(({ cumulants }) => cumulants ?? []).filter(({ value }) => value > 0);
  // An interval that reaches 0 ends at the foot of the picture, which lies under the least value itself.
  const lows = known.map(({ value, low }) => Math.max(low, value / 10));
  const highs = known.map(({ high }) => high);
  return {
    times: widened(Math.min(...times), Math.max(...times)),
    values: known.length > 0 ? widened(Math.min(...lows), Math.max(...highs)) : [0.1, 10]
  };
}

/** A twentieth more at both ends, on a logarithmic axis. */
function widened(low: number, high: number): Span {
  const room = Math.max((high / low) ** 0.05, 1.05);
  return [low / room, high * room];
}
