import type { CellReport, Hindrance, Mark } from '../../../stats/versions/types';

/** One version of the chosen group as the charts draw it. */
export interface TimelinePoint extends Omit<CellReport, 'group' | 'smallestRise'> {
  /** Upper limit of the divergence beside that of the reference; null where either has no report, or they are not alike. */
  divergenceLimit: number | null;
}

/** A cell of the table of marks. */
export interface TimelineMark {
  mark: Mark;
  /** Variance over ceiling over that of the reference, and its p adjusted over all cells; null without a test. */
  factor: number | null;
  pAdjusted: number | null;
  hindrance: Hindrance | null;
  /** Whether a rise of the tolerance would be seen with 80 % power. */
  seesRise: boolean;
}

/** What of a device's versions the page draws: marks of every cell, and the points of one group. */
export interface DeviceTimeline {
  /** Versions with datasets, in order. */
  versions: { id: string; name: string }[];
  reference: string | null;
  /** Name of the reference that was asked for, or that the gate's rule names, and is not here any more. */
  goneReference: string | null;
  groups: string[];
  group: string | null;
  /** Whether a group was asked for that is not among them: another is drawn. */
  goneGroup: boolean;
  alpha: number;
  tolerance: number;
  points: TimelinePoint[];
  /** Groups down, versions across; null where nothing was measured. */
  marks: (TimelineMark | null)[][];
  /** Two versions whose first datasets came the other way round than they stand. */
  outOfOrder: { earlier: string; later: string } | null;
  statement: string;
  because: string[];
  cautions: string[];
}
