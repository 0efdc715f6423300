/** What a test on the order of shots says before adjustment, or why it could not run. */
export type OrderOutcome<Details> = ({ ok: true } & OrderResult & Details) | { ok: false; reason: string };

export interface OrderResult {
  statistic: number;
  p: number;
  /** Smallest p the test could have shown. */
  smallestP: number;
  /** Permutations drawn; 0 when the limit law was used. */
  resamples: number;
  stoppedEarly: boolean;
  source: 'permuted' | 'limit';
}

export interface OrderOptions {
  /** Permutations at most. */
  resamples: number;
  seed: number;
  /** Permutation b draws from stream `stream` + b; 0 by default. */
  stream?: number;
}

/**
 * Above this many shots a limit law stands in for permutations where it is known to hold (see `limitHolds` in each
 * test): up to here 1999 permutations take 2 s at most, twice that many shots would take 4.
 */
export const LONGEST_PERMUTED = 20_000;

/** Limit laws give any p; below this they say no more than "beyond doubt", and 0 would look like a fault. */
export const SMALLEST_LIMIT_P = 1e-300;
