import { normalQuantile } from '../numerics/normal-quantile';
import { foundChance } from './found-chance';
import { neighbourShare, type Seek } from './pair-tests';

/** A chance to be found, and shots for a chance of 80 %; null where more than a thousand million would be needed. */
export interface FoundChance {
  power: number;
  shots: number | null;
}

/** What a map could find of one pair of a given correlation. */
export interface PairPower {
  correlation: number;
  /** Share of the shots on which each of its two sites is excited. */
  rate: number;
  neighbour: FoundChance;
  /** Null where all pairs are neighbours. */
  distant: FoundChance | null;
}

export interface PowerAsked {
  sites: number;
  shots: number;
  geometry: 'chain' | 'ring';
  alpha: number;
  seek: Seek;
  rate: number;
}

const most = 1e9;

/**
 * The chance that one pair of correlation r, both its sites of one rate, is found among all pairs of N sites: that its p is
 * within the share of α that the first step of the weighted Holm procedure gives it (foundChance). Rare excitations
 * cost much: at S = 5000, r = 0.05 and 64 sites a rise of neighbours is found with 62 % at a rate of ½, 52 % at 0.1.
 *
 * Shots for 80 % are searched to three digits.
 *
 * @param correlation r above 0 and under 1
 * @throws RangeError for any other r
 */
export function pairPower(correlation: number, asked: PowerAsked): PairPower {
  if (!(correlation > 0 && correlation < 1)) throw new RangeError(`a correlation of ${correlation}`);
  const { sites, shots, geometry, alpha, seek, rate } = asked;
  const all = (sites * (sites - 1)) / 2;
  const near = geometry === 'ring' && sites > 2 ? sites : sites - 1;
  const share = neighbourShare[seek];
  const reach = (part: number, pairs: number): FoundChance => {
    const level = (alpha * part) / pairs;
    const power = (number: number) => foundChance(correlation, { rate, shots: number, level, seek });
    return { power: power(shots), shots: shotsFor(power, correlation, level) };
  };
  return {
    correlation,
    rate,
    // Where all pairs are neighbours they have all of the error.
    neighbour: reach(all > near ? share : 1, near),
    distant: all > near ? reach(1 - share, all - near) : null
  };
}

function shotsFor(power: (shots: number) => number, correlation: number, level: number): number | null {
  // Near enough for common excitations; the chance rises with the shots but for small steps.
  let low = Math.ceil(((normalQuantile(1 - level) + normalQuantile(0.8)) / correlation) ** 2 / 2);
  let high = low;
  while (power(high) < 0.8) {
    low = high;
    high *= 2;
    if (high > most) return null;
  }
  while (high - low > high / 1000 && high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (power(middle) < 0.8) low = middle;
    else high = middle;
  }
  return Number(high.toPrecision(3));
}
