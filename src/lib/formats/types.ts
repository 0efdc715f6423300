import type { CountData, Geometry, Unit } from '../stats/types';

/** `positions`: one number of shots a line, for 0, 1, 2 … defects in that order. */
export type FormatId = 'counts' | 'shots' | 'positions' | 'json';
export type Encoding = 'utf-8' | 'utf-16le' | 'utf-16be' | 'windows-1252';
/** `spaces` is any run of spaces or tabs; `none` keeps each line whole. */
export type Separator = 'comma' | 'semicolon' | 'tab' | 'spaces' | 'none';
/** What a column holds. `frequency` is a number of shots, `shot` the number of one shot. */
export type Role = 'count' | 'frequency' | 'shot' | 'batch' | 'condition' | 'ignored';
export type DecimalMark = '.' | ',';
/** What groups digits by three; spaces and apostrophes are always understood. */
export type ThousandsMark = '.' | ',' | 'none';

/** What a person may settle beforehand, or change after seeing what was guessed. */
export interface ReadOptions {
  format?: FormatId | 'auto';
  encoding?: Encoding;
  separator?: Separator;
  header?: boolean;
  /** Columns by number from 1 or by header name; columns not named here are still guessed. */
  columns?: { column: number | string; role: Role }[];
  decimal?: DecimalMark;
  thousands?: ThousandsMark;
  /** Counts above it are refused. Left out: a number of trials stated in the file is used. */
  trials?: number | null;
  /** Name of a file that holds one dataset only. */
  name?: string;
  /** Default 20 MB. */
  maxBytes?: number;
  /** Default 2 000 000; a plain list of whole numbers is limited by `maxBytes` alone. */
  maxRows?: number;
}

/** One decision about a file: `given` by the person, `stated` by the file itself, or `guessed`. */
export interface Guess<T> {
  value: T;
  from: 'guessed' | 'given' | 'stated';
  /** Reason in plain words. */
  why: string;
}

export interface ColumnReading {
  /** From 1, as a person counts. */
  column: number;
  name: string | null;
  role: Guess<Role>;
}

/** How the bytes were understood; a part is null where it does not apply or was not reached. */
export interface Reading {
  encoding: Guess<Encoding> | null;
  format: Guess<FormatId> | null;
  separator: Guess<Separator> | null;
  header: Guess<boolean> | null;
  columns: ColumnReading[];
  decimal: Guess<DecimalMark | 'none'> | null;
  thousands: Guess<ThousandsMark | 'space' | 'apostrophe'> | null;
  /** Closing row such as "10+", and its line. */
  lump: { from: number; line: number } | null;
  /** Opening row such as "0-2", and its line; left out when there is none. */
  below?: { to: number; line: number };
  rows: number;
  blankLines: number;
  commentLines: number;
}

/** One thing wrong with the input; `line` and `column` count characters from 1. */
export interface Problem {
  line: number | null;
  column: number | null;
  /** What was wrong. */
  message: string;
  /** What to do. */
  fix: string;
}

/** Options of the diagnosis that the file itself states. */
export interface Suggested {
  trials?: number | null;
  unit?: Unit;
  geometry?: Geometry;
  misread?: number | null;
  misreadUncertainty?: number | null;
  /** Counts kept; left out where no cut is stated. */
  kept?: { from: number; to: number | null };
}

export interface Dataset {
  name: string;
  conditions: Record<string, string>;
  data: CountData;
  suggested: Suggested;
}

export type ReadResult =
  | { ok: true; datasets: Dataset[]; reading: Reading; notes: string[] }
  | { ok: false; problems: Problem[]; /** Problems beyond those listed. */ more: number; reading: Reading };

/** What one format makes of a text. Problems go to the shared list. */
export interface Outcome {
  datasets: Dataset[];
  notes: string[];
}
