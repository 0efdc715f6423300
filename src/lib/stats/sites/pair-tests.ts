import { benjaminiHochberg } from '../multiple/benjamini-hochberg';
import { weightedHolm } from '../multiple/weighted-holm';
import { countTogether } from './count-together';
import { logFisherP } from './log-fisher-p';
import { logRiseP } from './log-rise-p';
import { siteColumns } from './site-columns';

/** One pair of sites, numbered from 0; `distance` in steps along the chain or the shorter way round the ring. */
export interface PairTest {
  first: number;
  second: number;
  distance: number;
  /** Shots on which both were excited. */
  together: number;
  /** Shots on which both were excited, over S, less the product of their rates. */
  covariance: number;
  /** Phi coefficient; null where a site never or always reads 1. */
  correlation: number | null;
  logP: number;
  p: number;
  /** Adjusted over all pairs: Holm's, half of the error for neighbours; and Benjamini and Hochberg's. */
  pHolm: number;
  pFalseShare: number;
}

/**
 * What is looked for, declared before the data are seen: association of either sign, with half of the error for
 * neighbours; or a rise alone, as crosstalk makes it, one-sided, with nine tenths of the error for neighbours.
 */
export type Seek = 'any' | 'rise';

/** Share of the family's error that neighbours have. */
export const neighbourShare = { any: 0.5, rise: 0.9 } as const satisfies Record<Seek, number>;

/**
 * Every pair of sites tested for association by Fisher's exact test, n(n−1)/2 of them, in the order (0,1), (0,2) …
 *
 * Neighbours, where crosstalk is looked for first, share half of the family's error and all other pairs the other
 * half (see Seek for a rise alone); this is fixed by the declared geometry, before any data. Either way any false alarm has a chance of at most
 * α where shots are alike and sites independent. Drift that all sites share shows as association of many pairs.
 *
 * @param shots packed rows: site i is bit i mod 8, lowest first, of byte ⌊i/8⌋; one or more
 */
export function pairTests(
  shots: Uint8Array[],
  sites: number,
  geometry: 'chain' | 'ring',
  seek: Seek = 'any'
): PairTest[] {
  const columns = siteColumns(shots, sites);
  const sums = columns.map((column) => countTogether(column, column));
  const total = shots.length;
  const pairs: PairTest[] = [];
  for (let first = 0; first < sites; first++) {
    for (let second = first + 1; second < sites; second++) {
      const both = countTogether(columns[first], columns[second]);
      const [a, b] = [sums[first], sums[second]];
      const spread = Math.sqrt(a * (total - a)) * Math.sqrt(b * (total - b));
      const apart = second - first;
      const logP = (seek === 'rise' ? logRiseP : logFisherP)(both, a, b, total);
      pairs.push({
        first,
        second,
        together: both,
        distance: geometry === 'ring' ? Math.min(apart, sites - apart) : apart,
        covariance: (both * total - a * b) / total ** 2,
        correlation: spread > 0 ? (both * total - a * b) / spread : null,
        logP,
        p: Math.exp(logP),
        pHolm: 1,
        pFalseShare: 1
      });
    }
  }
  const p = pairs.map((pair) => pair.p);
  const near = pairs.filter(({ distance }) => distance === 1).length;
  const share = neighbourShare[seek];
  const weights = pairs.map(({ distance }) =>
    distance === 1 ? share / near : (1 - share) / (pairs.length - near)
  );
  const adjusted = weightedHolm(p, weights);
  const shares = benjaminiHochberg(p);
  for (const [i, pair] of pairs.entries()) [pair.pHolm, pair.pFalseShare] = [adjusted[i], shares[i]];
  return pairs;
}
