import type { Interval } from '../types';

/** The variance against its ceiling for one number of trials. */
export interface TrialsPoint {
  /** null: unknown, the Poisson ceiling. */
  trials: number | null;
  ceiling: number;
  dispersion: Interval;
  /** By the interval of the variance alone: all of it over the ceiling, under 1 + tolerance, or neither. */
  standing: 'over' | 'within' | 'unsure';
}

/** How the variance stands to its ceiling as N runs from the largest count to unknown. */
export interface TrialsPart {
  points: TrialsPoint[];
  /** N at which the ceiling equals the variance; null where no N rescues independence. */
  critical: number | null;
  statement: string;
}
