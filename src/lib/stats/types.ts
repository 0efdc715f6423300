/** Shot counts summed over shots: what most experiments publish. */
export interface Histogram {
  kind: 'histogram';
  /** `[count, shots]`, counts ascending and distinct, shots ≥ 1 (zeros may be kept; they change nothing). */
  counts: [number, number][];
  /** A closing row such as "10+": `shots` shots had count ≥ `from`. `from` exceeds every listed count. */
  lump: { from: number; shots: number } | null;
  /** An opening row such as "0-2": `shots` shots had count ≤ `to`, which lies below every listed count. Null or left out: none. */
  below?: { to: number; shots: number } | null;
}

/** One count a shot in the order taken; `batches[i]` names the batch of shot i. */
export interface ShotList {
  kind: 'shots';
  shots: number[] | Uint32Array;
  batches: string[] | null;
}

export type CountData = Histogram | ShotList;

export type Unit = 'defect' | 'pair';
export type Geometry = 'sites' | 'open-bonds' | 'ring-bonds';

/** What the person says about the experiment, and how hard to look. */
export interface DiagnoseOptions {
  /** Largest possible count N (sites, bonds or modes); null when unknown or unbounded. */
  trials: number | null;
  /** `pair`: counts are even, and n/2 out of N/2 is tested. */
  unit: Unit;
  /** Level of the answer, 0 < α < 1; 0.01 by default. */
  alpha: number;
  /** Excess of variance over the ceiling that would matter, as a fraction; 0.1 by default. */
  tolerance: number;
  /** Resampled histograms at most; 1999 by default. */
  resamples: number;
  /** Seed of every random draw, an integer 0 … 2^32 − 1. */
  seed: number;
  /** Probability that one site is misread; null when not stated. */
  misread: number | null;
  /** Standard uncertainty of that rate; null or left out: taken as exact. */
  misreadUncertainty?: number | null;
  geometry: Geometry;
  /** Counts that were kept, both ends included (`to` null: nothing was cut above); null or left out: no shot was dropped. */
  kept?: { from: number; to: number | null } | null;
  /** A law to compare with: one probability per trial; null for none. */
  supplied: number[] | null;
}

/** A value with its 95 % interval; `low`/`high` null where the data set no limit. */
export interface Interval {
  value: number | null;
  low: number | null;
  high: number | null;
}

/** `trials` trials that share the probability `p`. */
export interface Level {
  p: number;
  trials: number;
}

/** A Poisson-binomial law by its distinct probabilities, with a Poisson part when N is unknown. */
export interface Law {
  levels: Level[];
  /** Mean γ of the Poisson part, G(z) = e^{γ(z−1)} Π(1−p+pz); 0 when N is known. */
  poissonPart: number;
}

/** Progress of one diagnosis: a share 0 … 1 and the step in hand. */
export interface Progress {
  share: number;
  step: 'fit' | 'floor' | 'resampling' | 'shot order' | 'explanations' | 'writing';
}

export type OnProgress = (progress: Progress) => void;

/** Input that cannot be diagnosed. `reason` is plain words for the person who gave it. */
export class BadInput extends Error {
  constructor(readonly reason: string) {
    super(reason);
    this.name = 'BadInput';
  }
}

export type * from './document-types';
export type { TestId } from './test-ids';
export type * from './misread/types';
