import type { Picture, Size } from '$lib/charts/picture';
import type { Table } from '$lib/charts/table';
import type { Diagnosis } from '$lib/stats/types';
import type { Span } from '../type/break-lines';

/** Significant digits of the numbers of a table: the same everywhere, or a column each. */
export type Digits = number | number[];

/** What a report is made of, before it is set on pages. */
export type Block =
  | { kind: 'heading'; text: string; sign?: 'more' | 'fewer'; after?: string }
  | { kind: 'paragraph'; text: string | Span[]; look?: 'body' | 'faint' | 'strong' | 'small' | 'smallFaint' }
  | { kind: 'list'; items: string[] }
  | { kind: 'terms'; terms: { term: string; words: (string | Span[])[] }[] }
  | { kind: 'facts'; facts: [string, string][] }
  | { kind: 'table'; caption: string; table: Table; digits?: Digits; under?: (string | null)[] }
  | { kind: 'figure'; title: string; what: string; draw: (size: Size) => Picture; fit?: boolean }
  | { kind: 'formulas'; formulas: Formula[] }
  | { kind: 'link'; address: string }
  | { kind: 'masthead'; name: string | null; line: string }
  | { kind: 'verdict'; document: Pick<Diagnosis, 'answer'> }
  | { kind: 'statement'; text: string }
  | { kind: 'space'; height: number };

export interface Formula {
  name: string;
  /** Written as "κ_2 ≤ μ(1 − μ/N)": _ lowers and ^ raises what follows, a sign or a {group}. */
  formula: string;
  /** The same read out. */
  alt: string;
  words: string;
}

/** A note in the margin. */
export interface MarginNote {
  title: string;
  paragraphs?: string[];
  items?: string[];
}

/** Blocks with the notes that stand beside them. */
export interface Row {
  blocks: Block[];
  notes?: MarginNote[];
}

export interface Part {
  title: string;
  rows: Row[];
}
