import type { DiagnoseOptions, Diagnosis, Interval } from '$lib/stats/types';

/** One of two results to be compared. */
export interface Comparable {
  document: Diagnosis;
  options: DiagnoseOptions;
}

/** A word, a number, or a number with its 95 % interval; null for none. */
export type ComparedValue = string | number | Interval | null;

export interface ComparedLine {
  name: string;
  first: ComparedValue;
  second: ComparedValue;
  /** The values differ in some digit. */
  changed: boolean;
  /** They differ by no more than rounding does: every number agrees to six digits. */
  slight: boolean;
}

/** Lines that belong together, such as the options. */
export interface ComparedPart {
  id: 'options' | 'engine' | 'data' | 'answer' | 'tests' | 'moments' | 'fit' | 'flags';
  title: string;
  lines: ComparedLine[];
  /** How many of the lines changed by more than rounding. */
  changes: number;
}

export interface Comparison {
  parts: ComparedPart[];
  changes: number;
  /** What changed and why it may have, in sentences. */
  summary: string[];
}
