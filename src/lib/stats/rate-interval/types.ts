import type { Interval, Verdict } from '../types';

/** What is concluded if a site is misread at one rate. */
export interface RateVerdict {
  rate: number;
  /** Largest variance of independent kinks so read, and variance over it. */
  ceiling: number;
  dispersion: Interval;
  verdict: Verdict;
}

/** Between two rates tried next to each other the answer changes. */
export interface RateChange {
  above: number;
  below: number;
  from: Verdict;
  to: Verdict;
}

/** A misread rate with its uncertainty, and the answer over the whole interval that it leaves. */
export interface RateSpread {
  /** Standard uncertainty of the rate, as stated. */
  uncertainty: number;
  /** Chance that the rate lies outside the interval, β: added to every p. */
  miss: number;
  /** The interval at 1 − β, cut at 0 and at the largest rate that the mean count allows. */
  low: number;
  high: number;
  /** True where the counts cut it short. */
  cutByCounts: boolean;
  /** Rates tried, rising: both ends, the one stated, the one that fits best within, eight more where tests of the fit alarm at all of these, and those between which the answer changes. */
  rates: RateVerdict[];
  changes: RateChange[];
  statement: string;
}
