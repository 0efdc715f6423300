import type { CommonCause } from './common-cause';
import type { DistanceCorrelation } from './correlation-by-distance';
import type { PairInCounts } from './pair-in-counts';
import type { PairPower } from './pair-power';
import type { Seek } from './pair-tests';

export interface SitesInput {
  /** Names of the sites in their order along the chain. */
  names: string[];
  /** Packed rows: site i is bit i mod 8, lowest first, of byte ⌊i/8⌋. */
  shots: Uint8Array[];
}

export interface SitesOptions {
  geometry: 'chain' | 'ring';
  /** Level of the family of all pairs, 0 < α < 1. */
  alpha: number;
  /** Declared before the data are seen. */
  seek: Seek;
}

/** One pair of sites, numbered from 0. */
export interface MappedPair {
  first: number;
  second: number;
  distance: number;
  together: number;
  /** Phi coefficient with its 95 % interval; null where a site never or always reads 1. */
  correlation: number | null;
  low: number | null;
  high: number | null;
  p: number;
  pHolm: number;
  pFalseShare: number;
}

export interface SitesReport {
  format: 'severalty.sites/1';
  engineVersion: string;
  geometry: SitesOptions['geometry'];
  alpha: number;
  seek: Seek;
  names: string[];
  shots: number;
  /** Shots on which each site was excited. */
  excited: number[];
  /** Counts of excited sites, and of kinks between neighbours: sample mean and variance, largest possible count. */
  counts: { sites: CountMoments; kinks: CountMoments | null };
  pairs: MappedPair[];
  byDistance: DistanceCorrelation[];
  common: CommonCause;
  /** What these shots could find of a pair with correlation 0.05. */
  power: PairPower;
  /** What the counts alone could show: of the strongest pair found, else of a pair with correlation 0.05. */
  inCounts: PairInCounts & { correlation: number };
  statement: string;
  because: string[];
  cautions: string[];
}

export interface CountMoments {
  mean: number;
  variance: number;
  trials: number;
}
