import type { Conditions } from './conditions';
import type { ReadingChoices } from './reading-choices';

/** A problem of a file, as formats tells it. */
export interface FileProblem {
  line: number | null;
  column: number | null;
  message: string;
  fix: string;
}

export interface NamedDataset {
  id: string;
  name: string;
}

/** One dataset that a file would become. */
export interface PreviewDataset {
  /** Its place in the file, from 0. */
  index: number;
  kind: 'histogram' | 'shots';
  shots: number;
  smallest: number;
  largest: number;
  /** The largest count stands for itself and all above. */
  open: boolean;
  /** The smallest ends an opening row such as "0-2". */
  opening: boolean;
  mean: number;
  batches: number | null;
  conditions: Conditions;
  /** Which column gave which condition, in words. */
  recognised: string[];
  /** From the same bytes, saved already. */
  already: NamedDataset[];
  /** The same counts from another file. */
  sameCounts: NamedDataset[];
}

/** A file as it would be saved. `reading` is formats' own report; `choices` what the person settled. */
export interface Preview<Reading = unknown> {
  file: { id: string; name: string; size: number; sha256: string };
  choices: ReadingChoices;
  reading: Reading;
  notes: string[];
  datasets: PreviewDataset[];
  problems: FileProblem[];
  /** Problems beyond those listed. */
  more: number;
}
