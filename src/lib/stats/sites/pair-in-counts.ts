import { smallestExcess } from '../answer/smallest-excess';
import { formatCount, formatNumber } from '../words/format-number';

/** What one correlated pair does to the counts, and what they could show; fractions of the ceiling. */
export interface PairInCounts {
  /** Excess of the variance over the ceiling that the pair leaves, after what unequal rates take; may be below 0. */
  excess: number;
  smallestExcess: number;
  visible: boolean;
  /** Shots for 80 % power; null where no number of shots shows it. */
  shotsNeeded: number | null;
  statement: string;
}

export interface PairAsked {
  /** r, of either sign. */
  correlation: number;
  /** Rates of its two sites. */
  pair: [number, number];
  /** Rates of all sites. */
  rates: number[];
  shots: number;
  /** Whether that pair was found, or stands for one that may be there. */
  found: boolean;
}

/**
 * Whether the counts alone could show one pair: it adds 2r·√(v_i v_j), v = p(1−p), to a variance that unequal rates hold
 * Σ(p_i − p̄)² under the ceiling N·p̄(1−p̄), against the smallest excess that S shots see with 80 % power at 5 %. A pair
 * that makes the variance smaller, or leaves it under the ceiling, is shown by no number of shots: independent trials can
 * have such a variance. Rates measured on S shots look less equal than they are: what their errors add to the sum is taken
 * off again.
 *
 * @throws RangeError for fewer than 2 sites or shots, or |r| > 1
 */
export function pairInCounts({ correlation, pair, rates, shots, found }: PairAsked): PairInCounts {
  const sites = rates.length;
  const mean = rates.reduce((sum, rate) => sum + rate, 0) / sites;
  if (!(sites >= 2 && shots >= 2 && Math.abs(correlation) <= 1))
    throw new RangeError('no pair of sites to judge');
  // Any mean inside 0 … N will do: the shape of equal trials does not depend on it.
  const smallest = smallestExcess(sites / 2, sites, shots)!;
  if (!(mean > 0 && mean < 1)) {
    const statement = 'No site ever changes: the count histogram alone cannot show a pair.';
    return { excess: 0, smallestExcess: smallest, visible: false, shotsNeeded: null, statement };
  }
  const ceiling = sites * mean * (1 - mean);
  const errors = (rates.reduce((sum, rate) => sum + rate * (1 - rate), 0) * (1 - 1 / sites)) / shots;
  const spread = rates.reduce((sum, rate) => sum + (rate - mean) ** 2, 0) - errors;
  const deficit = Math.max(0, spread) / ceiling;
  const [v, w] = pair.map((rate) => rate * (1 - rate));
  const change = (2 * correlation * Math.sqrt(v * w)) / ceiling;
  const excess = change - deficit;
  const visible = excess >= smallest;
  // The smallest excess falls as 1/√S.
  const shotsNeeded = excess > 0 ? Math.ceil(shots * (smallest / excess) ** 2) : null;
  const percent = (value: number) => `${formatNumber(100 * value, 2)} %`;
  const held = deficit >= 0.0005 ? `, while unequal rates take ${percent(deficit)} from it` : '';
  const what =
    change >= 0
      ? `adds ${percent(change)} of its ceiling to the variance of the count${held}; ${formatCount(shots)} shots see an excess of ${percent(smallest)} or more`
      : `makes the variance of the count smaller, by ${percent(-change)} of its ceiling, which is no sign of dependence`;
  const which = found ? 'That pair' : 'Such a pair';
  const statement = `One pair with correlation ${formatNumber(correlation, 2)} among ${sites} sites ${what}. ${
    visible
      ? `The count histogram alone can show ${found ? 'this' : 'such a'} pair.`
      : `The count histogram alone cannot show ${found ? 'this' : 'such a'} pair.`
  } ${
    shotsNeeded === null
      ? `${which} is shown by no number of shots of counts alone.`
      : `${which} would show in the counts alone with 80\u202f% power from about ${formatCount(Number(shotsNeeded.toPrecision(2)))} shots on.`
  }`;
  return { excess, smallestExcess: smallest, visible, shotsNeeded, statement };
}
