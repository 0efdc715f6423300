import type { TestId } from './test-ids';
import type { DriftPart } from './drift/types';
import type { Explanations } from './explanations/types';
import type { TrialsPart } from './sensitivity/types';
import type { EmptyAside } from './truncation/empty-aside';
import type { PairsPart } from './pairs/types';
import type { LumpedLimits } from './moments/lumped-limits';
import type { MisreadPart } from './misread/types';
import type { Geometry, Interval, Level, Unit } from './types';

export type FlagId =
  'bunching' | 'bursts' | 'coarsening' | 'pairing' | 'dead-shots' | 'drift' | 'misreads' | 'regular';
export type ReferenceId = 'equal-trials' | 'rare-events' | 'gaussian' | 'landau-zener' | 'supplied';
export type Verdict = 'compatible' | 'ruled-out' | 'undecided';

export interface Reference {
  id: ReferenceId;
  logLikelihood: number;
  /** KL(p̂ ‖ law), nats a shot; null when the law gives an observed count no probability. */
  divergence: number | null;
  aic: number;
  /** Name → value of what was fitted, e.g. `{ p: 0.3377 }`. */
  parameters: Record<string, number>;
}

export interface DistributionPoint {
  count: number;
  density: number | null;
  shots: number;
  /** h_n / S with its exact (Clopper–Pearson) 95 % interval, and the fitted probability. */
  observed: number;
  low: number;
  high: number;
  fitted: number;
  /** True for a row that lumps counts: the closing "n or more", or with `below` the opening "n or fewer". */
  lump: boolean;
  below?: true;
}

export interface RatePoint {
  count: number;
  density: number | null;
  /** −ln(h_n/S)/scale; null for a count never seen. */
  empirical: number | null;
  low: number;
  high: number | null;
  /** −ln f_n/scale of the fitted law; null where the law gives no probability. */
  fitted: number | null;
  /** Large-deviation limit I(n/N) of the fitted law. */
  limit: number | null;
  /** Central-limit parabola of the fitted mean and variance. */
  gaussian: number | null;
}

export interface TailPoint {
  count: number;
  side: 'high' | 'low';
  /** Shots with a count ≥ (high) or ≤ (low) `count`. */
  shots: number;
  observed: number;
  low: number;
  high: number;
  fitted: number;
  /** Bounds: Chernoff of the fitted law, Chernoff from the mean alone, Hoeffding's extremal tail. */
  chernoff: number;
  meanChernoff: number;
  hoeffding: number;
}

export interface Certificate {
  p: number;
  side: 'high' | 'low';
  /** Most telling count. */
  count: number;
  /** How many counts were tried on both sides together. */
  thresholds: number;
  /** Largest tail probability any independent-trial law with that mean allows at `count`. */
  bound: number;
  /** Shots seen in that tail. */
  shots: number;
  /** Unfavourable end of the interval for the mean that was used. */
  mean: number;
}

export interface TestResult {
  id: TestId;
  statistic: number;
  p: number;
  /** Holm over the tests that ran. */
  pAdjusted: number;
  /** Smallest p this test could have shown. */
  smallestP: number;
  source: 'exact' | 'resampled' | 'permuted' | 'limit';
  /** Resampled or permuted histograms drawn; fewer than asked when the sequential rule ended early. */
  resamples: number;
  stoppedEarly: boolean;
}

export interface Flag {
  id: FlagId;
  grade: 'shown' | 'hinted';
  tests: TestId[];
  statement: string;
  /** How big, in words and numbers. */
  size: string;
  otherCauses: string[];
  next: string[];
}

/** Everything a page, PDF, API answer or script needs. Plain JSON: numbers are finite or null. */
export interface Diagnosis {
  format: 'severalty.diagnosis/1';
  engine: { version: string; seed: number; resamples: number; alpha: number; tolerance: number };
  data: {
    /** sha256 of the canonical histogram. */
    digest: string;
    shots: number;
    trials: number | null;
    unit: Unit;
    geometry: Geometry;
    misread: number | null;
    /** Standard uncertainty of that rate, where one was stated; since engine 0.6. */
    misreadUncertainty?: number;
    /** As given; for unit `pair` everything after `data` counts pairs, n/2. */
    counts: [number, number][];
    lump: { from: number; shots: number } | null;
    /** An opening row "0 to `to`"; left out when there is none. */
    below?: { to: number; shots: number };
    /** Counts that were kept, where a cut was declared; since engine 0.5. */
    kept?: { from: number; to: number | null };
    /** True when shot order was known; number of batches, or null. */
    ordered: boolean;
    batches: number | null;
  };
  moments: {
    mean: Interval;
    variance: Interval;
    /** Third and fourth are null with a lump, since engine 0.9: it hides them. */
    third: Interval;
    fourth: Interval;
    fano: Interval;
    ceiling: number;
    /** Unbiased variance over ceiling. */
    dispersion: Interval;
    criticalTrials: number | null;
    pairCovariance: number | null;
  };
  /** What can look like interaction; each part is there only where it has something to say. */
  nuisances?: {
    /** With a lump: what mean and unbiased variance of these shots can be, in the unit tested. */
    lumped?: LumpedLimits;
    /** For single kinks on an open chain or a ring of known length; on a ring since engine 0.9, where no count is odd. */
    misread?: MisreadPart;
    /** For shot lists, since engine 0.5. */
    drift?: DriftPart;
    /** For single defects on a ring, or with even counts only, since engine 0.5. */
    pairs?: PairsPart;
    /** Where there are too many empty shots, since engine 0.5. */
    emptyAside?: EmptyAside;
    /** How the variance stands as N runs, for plain independent trials; since engine 0.5. */
    trials?: TrialsPart;
  };
  fit: {
    logLikelihood: number;
    levels: Level[];
    poissonPart: number;
    divergence: number;
    floor: number;
    divergenceCorrected: number | null;
    divergenceInterval: Interval;
    gSquared: number;
    shotsToNotice: number | null;
    /** True when found and floor agree: the fit is then the global best. */
    certified: boolean;
    how: string;
    references: Reference[];
    /** References left out, and why. */
    omitted: { id: ReferenceId; reason: string }[];
  };
  distribution: DistributionPoint[];
  rate: {
    /** Largest rate S shots can show, ln(S)/scale. */
    horizon: number;
    /** Above this rate the data say nothing at 95 %. */
    silence: number;
    /** N, or 1 when N is unknown (rates are then in nats a shot). */
    scale: number;
    points: RatePoint[];
  };
  tails: { points: TailPoint[]; certificate: Certificate | null };
  tests: TestResult[];
  /** Tests that did not run, and why. */
  notRun: { id: TestId; reason: string }[];
  flags: Flag[];
  answer: {
    verdict: Verdict;
    statement: string;
    because: string[];
    /** Smallest excess over the ceiling seen with 80 % power at 5 %, as a fraction of the ceiling. */
    smallestExcess: number | null;
    shotsToDecide: number | null;
  };
  cautions: string[];
  /** What else it could be; only where independent trials are ruled out, and not in documents before engine 0.2. */
  explanations?: Explanations;
}
