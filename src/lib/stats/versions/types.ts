import type { DiagnoseOptions, Geometry, Histogram, Unit } from '../types';
import type { PairsReport } from './compare-pairs';

/** An estimate with its 95 % interval, both ends known. */
export interface KnownInterval {
  value: number;
  low: number;
  high: number;
}

/** What the newest diagnosis of a dataset says of it. */
export interface CellDiagnosis {
  verdict: string;
  /** Divergence from the best independent trials, with its interval. */
  divergence: { value: number | null; low: number | null; high: number | null } | null;
}

/** Shots of one group under one version, as they come in. */
export interface VersionCell {
  group: string;
  version: string;
  /** Name of the dataset. */
  label: string;
  /** Counts as uploaded, in defects, also where the unit is pairs. */
  histogram: Histogram;
  /** N of the counts as uploaded; null when unknown. */
  trials: number | null;
  unit: Unit;
  geometry: Geometry;
  misread?: number | null;
  kept?: DiagnoseOptions['kept'];
  /** Null while it is not diagnosed yet; left out where nobody waits for a diagnosis. */
  diagnosis?: CellDiagnosis | null;
}

export interface VersionsOptions {
  /** Versions in order; those without cells are kept. */
  versions: string[];
  /** Null: no limits and no marks. */
  reference: string | null;
  /** Level of the marks, adjusted over all cells. */
  alpha: number;
  /** Excess that matters: where a rise of that size would not be seen with 80 % power, nothing can be told. */
  tolerance: number;
  /** Groups and versions whose pairs are tested by shuffles; null for none. */
  pairs: { groups: string[]; versions: string[]; seed: number } | null;
}

/** Why a cell, or a group at the gate, cannot be judged. */
export type Hindrance =
  | 'no-counts'
  | 'no-reference'
  | 'not-diagnosed'
  | 'lumped'
  | 'cut'
  | 'misread-bonds'
  /** Kinks round a ring come in twos: counted one by one their variance is twice what the ceiling allows. */
  | 'ring-in-defects'
  | 'no-spread'
  | 'odd-pairs'
  | 'trials-differ'
  | 'unit-differs'
  | 'geometry-differs'
  | 'too-few-shots'
  /** Its own interval lies above the tolerance, though not by enough among all the tests of a gate. */
  | 'above-tolerance';

export type Mark = 'reference' | 'risen' | 'differs' | 'no-difference-seen' | 'cannot-tell' | 'unmarked';

export interface CellReport {
  group: string;
  version: string;
  label: string;
  shots: number;
  /** Null where counts are lumped or cut. The mean is in the cell's unit. */
  mean: KnownInterval | null;
  /** Variance over ceiling. */
  dispersion: KnownInterval | null;
  divergence: CellDiagnosis['divergence'];
  verdict: string | null;
  /** Where a version with the reference's law and its own shots would lie with 99.73 %; no mean where N is another. */
  limits: { mean: [number, number] | null; dispersion: [number, number] } | null;
  /** Dispersion over that of the reference, with its one-sided p and Holm's over all cells. */
  rise: { factor: number; p: number; pAdjusted: number } | null;
  /** Smallest true rise over the reference seen with 80 % power at alpha over the number of cells, as a fraction. */
  smallestRise: number | null;
  mark: Mark;
  hindrances: Hindrance[];
}

export interface VersionsReport {
  format: 'severalty.versions/1';
  reference: string | null;
  alpha: number;
  tolerance: number;
  versions: string[];
  groups: string[];
  cells: CellReport[];
  pairs: (PairsReport & { versions: string[]; resamples: number; canReachAlpha: boolean }) | null;
  statement: string;
  because: string[];
  cautions: string[];
}

export interface GateRule {
  /** Name of the reference version; null once it is removed. */
  reference: string | null;
  /** Excess of variance over the ceiling that is allowed, as a fraction. */
  tolerance: number;
  alpha: number;
  /** Groups that count; null for every group of the reference or the version. */
  groups: string[] | null;
}

export interface GateTest {
  z: number;
  p: number;
  pAdjusted: number;
}

export interface GateGroup {
  group: string;
  outcome: 'passed' | 'failed' | 'undecided';
  dispersion: KnownInterval | null;
  referenceDispersion: KnownInterval | null;
  /** One-sided: is variance/ceiling above 1 + tolerance? */
  overTolerance: GateTest | null;
  /** One-sided: is variance/ceiling above that of the reference? */
  overReference: (GateTest & { factor: number }) | null;
  /**
   * Smallest excess over the ceiling that is seen to be above the tolerance with 80 % power at alpha over the number of
   * tests, as a fraction: never less than the tolerance.
   */
  smallestExcess: number | null;
  /** The same for a rise over the reference. */
  smallestRise: number | null;
  hindrances: Hindrance[];
  /** In words, one sentence each. */
  reasons: string[];
}

export interface GateReport {
  format: 'severalty.gate/1';
  version: string;
  rule: GateRule;
  outcome: 'passed' | 'failed' | 'undecided';
  /** How many tests Holm's rule took together; tests that could not be made count too. */
  tests: number;
  groups: GateGroup[];
  statement: string;
  because: string[];
  cautions: string[];
}
