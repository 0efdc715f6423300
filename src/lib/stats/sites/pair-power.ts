import { normalCdf } from '../numerics/normal-cdf';
import { normalQuantile } from '../numerics/normal-quantile';
import { neighbourShare, type Seek } from './pair-tests';

/** What a map could find of one pair of a given correlation: chances, and shots for a chance of 80 %. */
export interface PairPower {
  correlation: number;
  neighbour: { power: number; shots: number };
  /** Null where all pairs are neighbours. */
  distant: { power: number; shots: number } | null;
}

/**
 * The chance that one pair of correlation r is found among all pairs of N sites: Φ(r√S − z), z the normal quantile of the
 * share of α that the first step of the weighted Holm procedure gives it. A formula of normal numbers, a few per cent
 * above what Fisher's exact test does: the tests hold it against simulation.
 *
 * @param correlation r above 0
 * @throws RangeError for r outside 0 … 1
 */
export function pairPower(
  correlation: number,
  {
    sites,
    shots,
    geometry,
    alpha,
    seek
  }: { sites: number; shots: number; geometry: 'chain' | 'ring'; alpha: number; seek: Seek }
): PairPower {
  if (!(correlation > 0 && correlation <= 1)) throw new RangeError(`a correlation of ${correlation}`);
  const all = (sites * (sites - 1)) / 2;
  const near = geometry === 'ring' && sites > 2 ? sites : sites - 1;
  const share = neighbourShare[seek];
  const reach = (part: number, pairs: number) => {
    const tail = (alpha * part) / pairs / (seek === 'rise' ? 1 : 2);
    const z = normalQuantile(1 - tail);
    return {
      power: normalCdf(correlation * Math.sqrt(shots) - z),
      shots: Math.ceil(((z + normalQuantile(0.8)) / correlation) ** 2)
    };
  };
  return {
    correlation,
    neighbour: reach(share, near),
    distant: all > near ? reach(1 - share, all - near) : null
  };
}
