import type { FittedTests } from '../resampling/fitted-tests';
import type { FittedLaw, FittedLevels } from '../resampling/fitted-law';
import type { Window } from '../laws/window';
import type { Certificate, Diagnosis } from '../types';

/** Logarithms of bounds for the tail at a count that need the mean alone. */
export interface TailBounds {
  meanChernoff(side: 'high' | 'low', count: number): number;
  hoeffding(side: 'high' | 'low', count: number): number;
}

/** Everything that a diagnosis asks of what it tests against. */
export interface NullLaw {
  /** The best law found, and what is needed to refit it. */
  levels: FittedLevels;
  law: FittedLaw;
  logLikelihood: number;
  /** Law that resamples are drawn from where that is not the best one. */
  drawnFrom?: FittedLevels;
  /** Largest variance at the observed mean where it is not that of independent trials; null where it is. */
  ceiling: number | null;
  /** The most dispersed law, and the ceiling as a function of the mean. */
  mostDispersed: { window: Window; ceiling: (mean: number) => number };
  certificate: Certificate | null;
  bounds: TailBounds;
  /** The `fit` part of the document, once the resamples are known. */
  report(fitted: FittedTests): Diagnosis['fit'];
}
