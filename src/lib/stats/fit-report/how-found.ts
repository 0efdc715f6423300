import type { BestLaw } from '../fit/best-law';
import { formatNumber } from '../words/format-number';

/** Found and floor agree when no more than this separates their log-likelihoods, nats in all. */
const agree = 0.01;

/** Whether the floor certifies the law as the global best, and in words how it was reached. */
export function howFound(
  best: BestLaw,
  divergence: number,
  floor: number,
  shots: number
): { certified: boolean; how: string } {
  const certified = (divergence - floor) * shots <= agree;
  const starts =
    best.starts === 1
      ? 'From equal trials, the only start that the variance suggests'
      : `From ${best.starts} starts, ${best.agreeing} of which ended within 0.01 nats of the best`;
  const limit = certified
    ? 'The floor equals it, so no independent-trial law fits better.'
    : `The floor lies ${formatNumber(divergence - floor, 2)} nats a shot lower: no independent-trial law fits better by more than that.`;
  return {
    certified,
    how: `${starts}; Newton on the levels in angles with the exact Hessian, then structural moves until none gains. ${limit}`
  };
}
