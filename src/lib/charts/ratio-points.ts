import type { KnownInterval, SteadyReport, SweepReport, SweptPoint } from '$lib/stats/sweep/types';

/** One ratio of every dataset that has it. */
export function ratioPoints(
  { points }: Pick<SweepReport, 'points'>,
  id: SteadyReport['id']
): { point: SweptPoint; one: KnownInterval }[] {
  const of = ({ ratios, pairFactor }: SweptPoint) =>
    id === 'pair-factor' ? pairFactor : ratios?.[id === 'variance-over-mean' ? 0 : 1];
  return points.flatMap((point) => {
    const one = of(point);
    return one ? [{ point, one }] : [];
  });
}
