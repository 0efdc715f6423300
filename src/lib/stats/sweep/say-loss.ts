import { formatNumber } from '../words/format-number';
import type { SweepReport } from './types';

/**
 * What F2/F1² says of loss after formation, if anything: nothing where the mean does not fall, and where it is steady only
 * with the change that would have been seen, 2.8 errors of the difference of both ends (80 % power at 5 %).
 */
export function sayLoss({
  laws,
  steady,
  points,
  alpha,
  unit
}: Omit<SweepReport, 'statement' | 'because' | 'cautions'>): string[] {
  const factor = steady.find(({ id }) => id === 'pair-factor');
  if (!factor || factor.p === null) return [];
  const one = unit === 'pair' ? 'pairs' : 'defects';
  if (!laws || !(laws.exponents[0].low > 0))
    return [`The mean does not surely fall over the window, so F₂/F₁² says nothing of how ${one} are lost.`];
  if (factor.p <= alpha)
    return [
      `F₂/F₁² changes with the hold time, which loss of single ${one} independently of each other would not do; loss of two ${one} at once would, and so would drift.`
    ];
  const known = points.flatMap(({ inWindow, pairFactor }) => (inWindow && pairFactor ? [pairFactor] : []));
  const error = (q: (typeof known)[number]) => (q.high - q.low) / (2 * 1.96);
  const [first, last] = [known[0], known[known.length - 1]];
  const seen = first
    ? ` From the first time to the last a change by ${formatNumber(2.8 * Math.hypot(error(first), error(last)), 2)} would be seen in four of five repeats, a smaller one not.`
    : '';
  return [
    `F₂/F₁² keeps its value within errors, which loss of single ${one} independently of each other would do.${seen}`
  ];
}
