import type { OddCounts } from '../misread/odd-counts';

/** Shots with an odd count, and what they say. */
export interface OddShots extends OddCounts {
  shots: number;
}

/** Whether defects should be counted in pairs, and what odd counts on a ring say of the reading. */
export interface PairsPart {
  /** Every count is even, too often for single defects, and N can be halved: count pairs. */
  proposed: boolean;
  /** ln of the chance that the best law of single defects gives only even counts; null where a lump hides them, or it gives none. */
  logChance: number | null;
  /** On a ring of known length: faults of the reading, from the odd counts. */
  odd: OddShots | null;
  statement: string;
}
