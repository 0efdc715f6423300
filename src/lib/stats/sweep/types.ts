import type { Interval, Unit, Verdict } from '../types';

/** An estimate with its 95 % interval, both ends known. */
export interface KnownInterval {
  value: number;
  low: number;
  high: number;
}

/** The saved dataset that a point was taken from. */
export interface SweptDataset {
  id: string;
  digest: string;
  /** Answer of its newest diagnosis when the sweep was made; null where there was none. */
  verdict: Verdict | null;
  /** Variance over ceiling of that diagnosis; null where it is not known. The first documents did not have it. */
  dispersion?: Interval | null;
}

/** One dataset of a sweep, as it comes in. */
export interface SweepInput {
  label: string;
  /** Quench or hold time, in the one unit of the sweep. */
  time: number;
  /** `[count, shots]`, counted in the unit of the sweep. */
  counts: [number, number][];
  /** N, and the rate at which a site is misread, as stated; null where none is. */
  trials?: number | null;
  misread?: number | null;
  dataset?: SweptDataset;
}

export interface SweepOptions {
  axis: 'quench-time' | 'hold-time';
  /** Unit of the times, as it is to be printed. */
  timeUnit: string;
  unit: Unit;
  /** Times from and to, both included, that the power laws are fitted to; null for all. */
  window: { from: number; to: number } | null;
  /** d, ν and z of a transition whose exponent the sweep is compared with. */
  transition: { dimension: number; correlation: number; dynamic: number } | null;
  /** Level at which one exponent, or a steady ratio, is refused. */
  alpha: number;
}

/** A condition that is not the same for all datasets of a sweep. */
export interface MixedCondition {
  of: 'device' | 'firmware' | 'group';
  /** Different ones stated, and datasets that state none. */
  stated: number;
  unstated: number;
}

export interface SweptPoint {
  label: string;
  time: number;
  shots: number;
  inWindow: boolean;
  /** N, and the rate at which a site is misread, as stated. The first documents did not have them. */
  trials?: number | null;
  misread?: number | null;
  /** Left out where the counts come from no saved dataset. */
  dataset?: SweptDataset;
  /** κ1, κ2, κ3; null where the counts take fewer than four values, which tells no errors. */
  cumulants: [KnownInterval, KnownInterval, KnownInterval] | null;
  /** κ2/κ1 and κ3/κ1. */
  ratios: [KnownInterval, KnownInterval] | null;
  /** F2/F1², for hold times alone. The first documents did not have it. */
  pairFactor?: KnownInterval | null;
  /** Covariance of the errors of κ1, κ2, κ3, 3 × 3 row by row, as null as they. The first documents did not have it. */
  covariance?: number[] | null;
}

export interface SweepLaws {
  /** How many of κ1, κ2, κ3 a power law could be fitted to. */
  quantities: number;
  /** b of κ_q = e^c τ^−b, each by itself. */
  exponents: KnownInterval[];
  /** ln κ_q at the middle of the window, and that middle as ln τ. */
  logLevels: number[];
  middle: number;
  chiSquare: number;
  freedom: number;
  /** Of power laws at all; null without freedom. */
  p: number | null;
  /** One exponent for all. */
  common: {
    exponent: KnownInterval;
    logLevels: number[];
    chiSquare: number;
    freedom: number;
    p: number;
    /** The same surprise in standard errors, both signs: P(|z| at least this large) = p. The first documents did not have it. */
    z?: number;
  };
}

export interface SteadyReport {
  id: 'variance-over-mean' | 'third-over-mean' | 'pair-factor';
  steady: KnownInterval;
  chiSquare: number;
  freedom: number;
  /** Of the same value at every time; null for one. */
  p: number | null;
  /** Values of known laws, and whether the interval holds them, their own error allowed for; none where the value is not steady. */
  references: { id: string; value: number; error: number; inside: boolean }[];
}

export interface SweepReport {
  format: 'severalty.sweep/1';
  axis: SweepOptions['axis'];
  timeUnit: string;
  unit: Unit;
  alpha: number;
  window: { from: number; to: number };
  points: SweptPoint[];
  /** Conditions that differ between the datasets; left out where none does. The first documents did not have it. */
  mixed?: MixedCondition[];
  laws: SweepLaws | null;
  /** Exponent expected of the transition given, and whether the interval of the common one holds it. */
  expected: {
    dimension: number;
    correlation: number;
    dynamic: number;
    exponent: number;
    /** Null where no power law can be fitted. */
    inside: boolean | null;
  } | null;
  steady: SteadyReport[];
  windows: {
    from: number;
    to: number;
    exponent: KnownInterval;
    commonP: number;
    lawP: number | null;
    /**
     * P(an exponent at least as far from that of the whole window), all windows allowed for; null for the whole window
     * itself. The first documents did not have it.
     */
    awayP?: number | null;
  }[];
  statement: string;
  because: string[];
  cautions: string[];
}
