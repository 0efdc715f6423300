import { smallestExcess } from '../answer/smallest-excess';
import { formatCount } from '../words/format-number';

/** What one correlated pair does to the counts, and what they could show; fractions of the independent variance. */
export interface PairInCounts {
  excess: number;
  smallestExcess: number;
  visible: boolean;
  statement: string;
}

/**
 * Whether the counts alone could show one pair of N sites of equal rate whose correlation is r: it adds 2r·p(1−p) to
 * a variance of N·p(1−p), a fraction 2r/N, against the smallest excess that S shots see with 80 % power at 5 %.
 *
 * @throws RangeError when N < 2, S < 2 or |r| > 1
 */
export function pairInCounts(correlation: number, sites: number, shots: number): PairInCounts {
  if (!(sites >= 2 && shots >= 2 && Math.abs(correlation) <= 1))
    throw new RangeError('no pair of sites to judge');
  const excess = (2 * correlation) / sites;
  // Any mean inside 0 … N will do: the shape of equal trials does not depend on it.
  const smallest = smallestExcess(sites / 2, sites, shots)!;
  const visible = excess >= smallest;
  const percent = (value: number) => `${Number((100 * value).toPrecision(2))} %`;
  const statement =
    `One pair with correlation ${correlation} among ${sites} sites changes the variance of the count by ` +
    `${percent(excess)}; ${formatCount(shots)} shots see a change of ${percent(smallest)} or more. ` +
    `The count histogram alone ${visible ? 'can' : 'cannot'} show this pair.`;
  return { excess, smallestExcess: smallest, visible, statement };
}
