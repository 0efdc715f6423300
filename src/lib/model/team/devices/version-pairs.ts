import type { PairTest } from '../../../stats/versions/compare-pairs';

/** Versions that are compared pair by pair at once: 28 pairs take about half a second. */
export const MOST_COMPARED = 8;

/** Pairs of versions of one group of a device, and what can be chosen. */
export interface VersionPairs {
  versions: { id: string; name: string; chosen: boolean }[];
  groups: string[];
  group: string | null;
  /** Null until two versions or more are chosen. */
  found: {
    tests: Omit<PairTest, 'group'>[];
    alpha: number;
    /** Shuffles of each pair at most. */
    resamples: number;
    because: string[];
    cautions: string[];
  } | null;
  /** Why nothing was compared, in words. */
  why: string | null;
}
