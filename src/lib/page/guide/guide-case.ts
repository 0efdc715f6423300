import type { Diagnosis } from '$lib/stats/types';

/** One invented dataset as the guide shows it. */
export interface ShownCase {
  title: string;
  about: string;
  /** What really made the counts. */
  cause: string;
  diagnosis: Diagnosis;
  /** The part after # that opens it on the first page; null when it would be too long. */
  address: string | null;
}
