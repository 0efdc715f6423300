import { weightedHolm } from '../multiple/weighted-holm';
import { BadInput } from '../types';
import { logChangeP } from './log-change-p';
import { neighbourShare, type Seek } from './pair-tests';
import type { SitesReport } from './sites-types';

/** How one pair stands in two maps, sites numbered from 0. */
export interface ChangedPair {
  first: number;
  second: number;
  distance: number;
  /** Phi coefficients; null where a site never or always reads 1. */
  earlier: number | null;
  later: number | null;
  p: number;
  /** Adjusted over all pairs, neighbours with the share of the error that a map gives them. */
  pHolm: number;
}

export interface MapsCompared {
  seek: Seek;
  /** Level of the family of all pairs: the stricter of the two maps'. */
  alpha: number;
  /** Whether all sites move together, or avoid each other, in either map: then pairs are not to be read one by one. */
  common: boolean;
  pairs: ChangedPair[];
}

/**
 * Which pairs' association differs between two maps of the same sites, by Zelen's exact test of each and Holm's rule over
 * all. A rise alone is tested only where both maps declared it before their data were seen. Any false alarm has a chance
 * of at most α where the shots of each map are alike.
 *
 * @throws BadInput for maps of other sites, or of another geometry
 */
export function compareMaps(earlier: SitesReport, later: SitesReport): MapsCompared {
  if (earlier.geometry !== later.geometry)
    throw new BadInput('One map is of a chain and the other of a ring: their pairs are not the same.');
  if (earlier.names.length !== later.names.length)
    throw new BadInput(`One map has ${earlier.names.length} sites and the other ${later.names.length}.`);
  const other = earlier.names.findIndex((name, i) => name !== later.names[i]);
  if (other >= 0)
    throw new BadInput(
      `Site ${other + 1} is called ${earlier.names[other]} in one map and ${later.names[other]} in the other.`
    );
  const seek: Seek = earlier.seek === 'rise' && later.seek === 'rise' ? 'rise' : 'any';
  const tableOf = ({ pairs, excited, shots }: SitesReport, i: number) => {
    const { first, second, together } = pairs[i];
    return { both: together, first: excited[first], second: excited[second], shots };
  };
  const tested = earlier.pairs.map(({ first, second, distance, correlation }, i) => ({
    first,
    second,
    distance,
    earlier: correlation,
    later: later.pairs[i].correlation,
    p: Math.exp(logChangeP(tableOf(earlier, i), tableOf(later, i), seek))
  }));
  const near = tested.filter(({ distance }) => distance === 1).length;
  const share = neighbourShare[seek];
  const adjusted = weightedHolm(
    tested.map(({ p }) => p),
    tested.map(({ distance }) => (distance === 1 ? share / near : (1 - share) / (tested.length - near)))
  );
  return {
    seek,
    alpha: Math.min(earlier.alpha, later.alpha),
    common: earlier.common.shown || later.common.shown,
    pairs: tested.map((pair, i) => ({ ...pair, pHolm: adjusted[i] }))
  };
}
